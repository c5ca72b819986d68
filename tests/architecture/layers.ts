/** The layers of src and what each may use. DEVELOPERS.md explains them; this is what is enforced. */
export const layers = ['units', 'thermo', 'blending', 'worker', 'state', 'headless', 'ui'] as const;
export type Layer = (typeof layers)[number];

/** The layers each one may import, types included. `src/main.tsx` alone may import all. */
export const mayUse: Readonly<Record<Layer, readonly Layer[]>> = {
  units: [],
  thermo: ['units'],
  blending: ['units', 'thermo'],
  worker: ['units', 'thermo', 'blending'],
  headless: ['units', 'thermo', 'blending'],
  state: ['units', 'blending'],
  ui: ['units', 'blending', 'state'],
};

/** Layers that compute only: time, ids, random streams and stored text come to them as arguments. */
export const pureLayers: readonly Layer[] = ['units', 'thermo', 'blending'];

/** What a pure layer may not name. The compiler knows no DOM there either, but it does know clock and chance. */
export const impureNames: ReadonlySet<string> = new Set([
  'Date', 'Math.random', 'performance', 'crypto', 'setTimeout', 'setInterval', 'setImmediate', 'queueMicrotask',
  'fetch', 'XMLHttpRequest', 'WebSocket', 'console', 'localStorage', 'sessionStorage', 'indexedDB', 'caches',
  'window', 'document', 'navigator', 'location', 'self', 'globalThis', 'process', 'Worker', 'eval', 'Function',
]);

/** Folders that must not know each other inside a layer: algorithms are handed coefficients, they do not fetch them. */
export const keptApart: readonly { readonly from: RegExp; readonly to: RegExp }[] = [
  { from: /^src\/thermo\/(terms|solve|mixture)\//, to: /^src\/thermo\/data\// },
];

/** Where each package may be imported from. A package that is not listed may be imported from nowhere. */
export const packageHomes: Readonly<Record<string, RegExp>> = {
  yalps: /^src\/blending\/stock\//,
  papaparse: /^src\/blending\/stock\//,
  mathjs: /^src\/units\//,
  valibot: /^src\/(blending|state|headless)\//,
  '@noble/hashes': /^src\/(blending|state)\//,
  zustand: /^src\/(state\/|ui\/bindings\/|main\.tsx$)/,
  react: /^src\/(ui\/|main\.tsx$)/,
  'react-dom': /^src\/(ui\/|main\.tsx$)/,
  recharts: /^src\/ui\/charts\//,
  node: /^src\/headless\//,
};

/** Longest file outside the coefficient data, lines. */
export const longestFile = 300;

/** Words that must not reach a person: a plan is never declared harmless, and ppm never stands without saying of what. */
export const forbiddenWords: readonly { readonly where: RegExp; readonly words: RegExp; readonly unless?: RegExp }[] = [
  { where: /^src\//, words: /\bsafe to\b|\b(?:is|are|was|be) safe\b|\bOK to fill\b/i },
  { where: /^src\/ui\//, words: /\bsafe\b/i },
  { where: /^src\/(ui|blending)\//, words: /(?<![\w-])pp[mb]\b/i, unless: /(?:µ|n)mol\/mol/ },
];
