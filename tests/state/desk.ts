import { emptyRecipe, type Recipe } from '../../src/blending/index.ts';
import {
  createWorkspace, memoryRecipeStorage, type RecipeStorage, type Workspace, type WorkspaceDependencies,
} from '../../src/state/index.ts';

/** What the invented planner of these tests answers: which recipe it was asked about. */
export interface Answer {
  readonly about: Recipe;
}

/** A clock that tests move by hand, with the timers that hang on it. */
export function fakeTime() {
  let now = 1_000_000;
  const timers = new Set<{ readonly at: number; readonly run: () => void }>();
  return {
    clock: () => now,
    schedule: (delay: number, run: () => void) => {
      const timer = { at: now + delay, run };
      timers.add(timer);
      return () => void timers.delete(timer);
    },
    pending: () => timers.size,
    pass: (ms: number) => {
      now += ms;
      for (const timer of [...timers].filter(({ at }) => at <= now)) {
        if (timers.delete(timer)) timer.run();
      }
    },
  };
}

export type FakeTime = ReturnType<typeof fakeTime>;

export const starters: readonly Recipe[] = [
  { ...emptyRecipe, name: 'First' },
  { ...emptyRecipe, name: 'Second' },
];

/** One window on a storage. Ids count up: `w1-1`, `w1-2`, … */
export function openWindow(
  storage: RecipeStorage,
  time: FakeTime,
  change: Partial<WorkspaceDependencies<Answer>> = {},
  letter = 'w1',
): Workspace<Answer> {
  let ids = 0;
  return createWorkspace<Answer>({
    planner: (recipe) => ({ about: recipe }),
    storage,
    clock: time.clock,
    newId: () => `${letter}-${(ids += 1)}`,
    schedule: time.schedule,
    program: 'fillwright test',
    starters,
    ...change,
  });
}

/** A first start on empty storage: `First` (w1-2) is open, `Second` (w1-1) is saved. */
export function desk(change: Partial<WorkspaceDependencies<Answer>> = {}) {
  const time = fakeTime();
  const memory = memoryRecipeStorage();
  const workspace = openWindow(memory.window(), time, change);
  return { time, memory, texts: memory.texts, ...workspace };
}

/** Storage over `inner` that fails while its switches say so. */
export function failingStorage(inner: RecipeStorage) {
  const faults = { full: false, unavailable: false, forgets: false };
  const off = { ok: false, reason: { code: 'storage-unavailable', detail: 'SecurityError' } } as const;
  const storage: RecipeStorage = {
    keys: () => (faults.unavailable ? off : inner.keys()),
    read: (key) => (faults.unavailable ? off : inner.read(key)),
    write(key, text) {
      if (faults.unavailable) return off;
      if (faults.full) return { ok: false, reason: { code: 'storage-full' } };
      return inner.write(key, faults.forgets ? text.slice(0, -1) : text);
    },
    remove: (key) => (faults.unavailable ? off : inner.remove(key)),
    subscribe: (listener) => inner.subscribe(listener),
  };
  return { storage, faults };
}
