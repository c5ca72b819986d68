import type { Plugin } from 'vite';

/**
 * Knows which modules the page reaches without waiting: over static imports
 * from its entry. What is fetched later by `import()` is not among them.
 */
export function reachedAtOnce(entry: RegExp): { readonly plugin: Plugin; readonly isReached: (id: string) => boolean } {
  const reached = new Set<string>();
  return {
    isReached: (id) => reached.has(id),
    plugin: {
      name: 'reached-at-once',
      buildEnd() {
        reached.clear();
        const next = [...this.getModuleIds()].filter((id) => entry.test(id));
        for (let id = next.pop(); id !== undefined; id = next.pop()) {
          if (reached.has(id)) continue;
          reached.add(id);
          next.push(...(this.getModuleInfo(id)?.importedIds ?? []));
        }
      },
    },
  };
}
