/** Why the program will not open without a network later; `reason` is the browser's own text. */
export type OfflineTrouble = { readonly kind: 'not offered by this browser' } | { readonly kind: 'refused'; readonly reason: string };

/** What the page is told about its offline copy. */
export interface OfflineListener {
  /** A newer build lies ready. Calling `takeOver` starts it at once, which reloads the page. */
  onNewVersion(takeOver: () => void): void;
  onTrouble(trouble: OfflineTrouble): void;
}

/**
 * Keeps a copy of the program on this machine. Does nothing in the development server, where a kept copy would hide
 * every change. Recipes are not part of the copy and are never touched by it.
 */
export function registerOffline(listener: OfflineListener): void {
  if (!import.meta.env.PROD) return;
  if (!('serviceWorker' in navigator)) {
    listener.onTrouble({ kind: 'not offered by this browser' });
    return;
  }
  navigator.serviceWorker.register('./sw.js', { updateViaCache: 'none' }).then(
    (registration) => { watch(registration, listener); },
    (error: unknown) => { listener.onTrouble({ kind: 'refused', reason: error instanceof Error ? error.message : String(error) }); },
  );
}

function watch(registration: ServiceWorkerRegistration, listener: OfflineListener): void {
  const offer = (worker: ServiceWorker): void => {
    listener.onNewVersion(() => {
      navigator.serviceWorker.addEventListener('controllerchange', () => { location.reload(); }, { once: true });
      worker.postMessage('take over');
    });
  };
  // Without a controller this is the first visit: what is being installed is this very build.
  if (registration.waiting && navigator.serviceWorker.controller) offer(registration.waiting);
  registration.addEventListener('updatefound', () => {
    const arriving = registration.installing;
    arriving?.addEventListener('statechange', () => {
      if (arriving.state === 'installed' && navigator.serviceWorker.controller) offer(arriving);
    });
  });
}
