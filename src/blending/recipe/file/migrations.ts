import { fail, ok, type Outcome } from '../../../units/index.ts';
import type { FileProblem } from './problem.ts';

/**
 * Steps from one version of the recipe to the next, by the version they start
 * from. A step passes through what it does not understand: the schema of the
 * newest version judges the result.
 */
export type Migrations = Readonly<Record<number, (old: unknown) => unknown>>;

/** The steps to the present version. */
export const migrations: Migrations = {
  // Version 2 only added fields, which the schema fills with what version 1 meant: one cylinder, nothing split, no conditioning.
  1: (recipe) => recipe,
};

/**
 * Takes the recipe part of a file from `version` to `newest`, one step at a time.
 * Fails with `newer-version` or, when a step is missing, `no-migration`.
 */
export function migrate(
  recipe: unknown,
  version: number,
  newest: number,
  steps: Migrations,
): Outcome<unknown, FileProblem> {
  if (version > newest) return fail({ code: 'newer-version', version, newest });
  let migrated = recipe;
  for (let from = version; from < newest; from += 1) {
    const step = Object.hasOwn(steps, from) ? steps[from] : undefined;
    if (step === undefined) return fail({ code: 'no-migration', version: from });
    migrated = step(migrated);
  }
  return ok(migrated);
}
