/**
 * The service worker: keeps one whole build of the program on this machine and answers from it first, so that the
 * program opens without a network. It is built to `sw.js` on its own and is imported by nothing.
 */

/** Written in front of this file by the build: the hash of the build, and its files relative to the page. */
declare const __OFFLINE_VERSION__: string;
declare const __OFFLINE_FILES__: readonly string[];

// The compiler's DOM and worker libraries cannot be loaded together; these are the parts used here.
interface LifetimeEvent extends Event { waitUntil(work: Promise<unknown>): void }
interface RequestEvent extends LifetimeEvent { readonly request: Request; respondWith(answer: Promise<Response>): void }
interface WorkerScope {
  readonly clients: { claim(): Promise<void> };
  readonly registration: { readonly scope: string };
  skipWaiting(): Promise<void>;
  addEventListener(type: 'install' | 'activate', listener: (event: LifetimeEvent) => void): void;
  addEventListener(type: 'fetch', listener: (event: RequestEvent) => void): void;
  addEventListener(type: 'message', listener: (event: MessageEvent<unknown>) => void): void;
}
const scope = self as unknown as WorkerScope;

// One address may serve several programs under different paths: the scope keeps their stores apart.
const storePrefix = `fillwright ${scope.registration.scope} `;
const store = storePrefix + __OFFLINE_VERSION__;
const page = new URL('index.html', scope.registration.scope).href;

async function keepBuild(): Promise<void> {
  const kept = await caches.open(store);
  // `reload` passes the browser's own cache by, which may still hold a file of the build before.
  await kept.addAll(__OFFLINE_FILES__.map((file) => new Request(new URL(file, scope.registration.scope), { cache: 'reload' })));
}

async function dropOtherBuilds(): Promise<void> {
  const names = await caches.keys();
  await Promise.all(names.filter((name) => name.startsWith(storePrefix) && name !== store).map((name) => caches.delete(name)));
  await scope.clients.claim();
}

async function answer(request: Request): Promise<Response> {
  const kept = await caches.open(store);
  // A server may vary its answer by the asking page's origin; here only this origin asks, so that is no difference.
  const options = { ignoreSearch: true, ignoreVary: true };
  const found = await kept.match(request.mode === 'navigate' ? page : request, options);
  return found ?? fetch(request);
}

scope.addEventListener('install', (event) => { event.waitUntil(keepBuild()); });
scope.addEventListener('activate', (event) => { event.waitUntil(dropOtherBuilds()); });
scope.addEventListener('message', (event) => {
  if (event.data === 'take over') void scope.skipWaiting();
});
scope.addEventListener('fetch', (event) => {
  const { request } = event;
  if (request.method !== 'GET' || new URL(request.url).origin !== location.origin) return;
  event.respondWith(answer(request));
});

// Makes this file a module of its own, so that its names do not leak into the other files.
export {};
