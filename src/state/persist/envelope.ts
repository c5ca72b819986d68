import { parseJson, readRecipeDocument, recipeDocument, type FileProblem, type Recipe } from '../../blending/index.ts';
import { fail, ok, type Outcome } from '../../units/index.ts';
import { recordOf, seal, unseal, type SealProblem } from './seal.ts';

/** The last sheet that went out: its revision and the content id printed on it. */
export interface Issued {
  /** From 1. */
  readonly revision: number;
  readonly contentId: string;
}

/** What is stored of one recipe. */
export interface Entry {
  readonly recipe: Recipe;
  /** Milliseconds since 1970. */
  readonly savedAt: number;
  readonly issued: Issued | null;
}

/** Why a stored entry is not trusted. It is left as it is. */
export type EntryProblem =
  | SealProblem
  /** The checksum holds, yet a field of the envelope is not what it should be. */
  | { readonly code: 'entry-invalid'; readonly field: 'body' | 'savedAt' | 'issued' }
  | FileProblem;

const format = 'fillwright-saved-recipe';
const newest = 1;

/** Writes an entry under a seal, see `seal.ts`. */
export function encodeEntry(entry: Entry, program: string): string {
  return seal(format, newest, JSON.stringify({
    savedAt: entry.savedAt,
    issued: entry.issued,
    file: recipeDocument(entry.recipe, program),
  }));
}

/** Reads an entry: the seal, then the content. Fails with the first problem. */
export function decodeEntry(text: string): Outcome<Entry, EntryProblem> {
  const body = unseal(text, format, newest);
  return body.ok ? decodeBody(body.value) : body;
}

function decodeBody(body: string): Outcome<Entry, EntryProblem> {
  const parsed = parseJson(body);
  const fields = parsed.ok ? recordOf(parsed.value) : null;
  if (fields === null) return fail({ code: 'entry-invalid', field: 'body' });
  const { savedAt } = fields;
  if (typeof savedAt !== 'number' || !Number.isFinite(savedAt)) return fail({ code: 'entry-invalid', field: 'savedAt' });
  const issued = fields.issued === null ? null : issuedOf(fields.issued);
  if (issued === undefined) return fail({ code: 'entry-invalid', field: 'issued' });
  const file = readRecipeDocument(fields.file);
  return file.ok ? ok({ recipe: file.value.recipe, savedAt, issued }) : file;
}

/** The noted sheet; undefined: not one. */
function issuedOf(value: unknown): Issued | undefined {
  const fields = recordOf(value);
  if (fields === null) return undefined;
  const { revision, contentId } = fields;
  if (typeof revision !== 'number' || !Number.isSafeInteger(revision) || revision < 1) return undefined;
  return typeof contentId === 'string' ? { revision, contentId } : undefined;
}
