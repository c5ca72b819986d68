import * as v from 'valibot';
import { fail, ok, type Outcome } from '../../../units/index.ts';
import type { Recipe } from '../document.ts';
import { fieldProblem, isVersion } from './field-problem.ts';
import { migrate, migrations, type Migrations } from './migrations.ts';
import type { FileProblem } from './problem.ts';
import { recipeFileSchema, recipeFileVersion, recipeSchema } from './schema.ts';

export type { FieldFault, FileProblem } from './problem.ts';
export { recipeBounds } from './schema.ts';
export { fileProblemSentence } from './sentences.ts';

const format = 'fillwright-recipe';

/** A recipe within its bounds cannot reach this; a longer text is not worth parsing. */
export const largestRecipeFile = 12_000_000;

/** A recipe read from a file, with the version and program that wrote it. */
export interface RecipeFile {
  readonly recipe: Recipe;
  /** As written in the file, before migration. */
  readonly version: number;
  /** Program name and version; empty when a person wrote the file. */
  readonly program: string;
}

/** Writes `recipe` as the text of a file: indented JSON, ends with a newline. */
export function encodeRecipeFile(recipe: Recipe, program: string): string {
  return `${JSON.stringify(recipeDocument(recipe, program), null, 2)}\n`;
}

/** The content of a recipe file as a plain object, for embedding in another document. */
export function recipeDocument(recipe: Recipe, program: string): object {
  return { format, version: recipeFileVersion, program, recipe };
}

/**
 * Reads the text of a recipe file. Fields that a person may leave out come back
 * with their defaults. Fails with the first `FileProblem` found.
 */
export function decodeRecipeFile(text: string): Outcome<RecipeFile, FileProblem> {
  if (text.length > largestRecipeFile) {
    return fail({ code: 'too-large', characters: text.length, limit: largestRecipeFile });
  }
  const parsed = parseJson(text);
  return parsed.ok ? readRecipeDocument(parsed.value) : parsed;
}

/** Reads a JSON text; a byte-order mark, as some editors write it, is passed over. Fails with `not-json`. */
export function parseJson(text: string): Outcome<unknown, { readonly code: 'not-json'; readonly detail: string }> {
  try {
    return ok(JSON.parse(text.startsWith('\uFEFF') ? text.slice(1) : text) as unknown);
  } catch (error) {
    if (error instanceof SyntaxError) return fail({ code: 'not-json', detail: error.message });
    throw error;
  }
}

/**
 * Reads the parsed content of a recipe file; as `decodeRecipeFile` from there.
 * `steps` are the migrations to the newest version.
 */
export function readRecipeDocument(
  document: unknown,
  steps: Migrations = migrations,
  newest: number = recipeFileVersion,
): Outcome<RecipeFile, FileProblem> {
  const header = v.safeParse(headerSchema, document);
  if (!header.success) return fail({ code: 'not-a-recipe-file' });
  const { version, recipe } = header.output;
  const current = { ...header.output };
  if (isVersion(version)) {
    const migrated = migrate(recipe, version, newest, steps);
    if (!migrated.ok) return migrated;
    current.version = recipeFileVersion;
    // A missing recipe stays missing, so that the schema names it so.
    if (recipe !== undefined) current.recipe = migrated.value;
  }
  const read = v.safeParse(recipeFileSchema, current, { abortEarly: true });
  if (!read.success) return fail(fieldProblem(read.issues[0]));
  return ok({ recipe: read.output.recipe, version: Number(version), program: read.output.program });
}

/** Whether a recipe made by editing could be read back from a file: null, or the first fault. */
export function recipeFault(recipe: Recipe): FileProblem | null {
  const read = v.safeParse(recipeSchema, recipe, { abortEarly: true });
  return read.success ? null : fieldProblem(read.issues[0]);
}

const headerSchema = v.looseObject({ format: v.literal(format) });
