import {
  checksum, parseJson, readRecipeDocument, recipeDocument, type FileProblem, type Recipe,
} from '../../blending/index.ts';
import { fail, ok, type Outcome } from '../../units/index.ts';

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
  | { readonly code: 'entry-empty' }
  /** No readable first line. */
  | { readonly code: 'entry-not-json' }
  | { readonly code: 'entry-other-format' }
  | { readonly code: 'entry-newer-version'; readonly version: number; readonly newest: number }
  /** Cut off or changed since it was written. */
  | { readonly code: 'entry-checksum' }
  /** The checksum holds, yet a field of the envelope is not what it should be. */
  | { readonly code: 'entry-invalid'; readonly field: 'body' | 'savedAt' | 'issued' }
  | FileProblem;

const format = 'fillwright-saved-recipe';
const newest = 1;

/**
 * Writes an entry: a first line with format, version and the SHA-256 of the
 * rest, then the rest as one line of JSON. The checksum is over the text as
 * stored, so it can be verified before anything in it is interpreted.
 */
export function encodeEntry(entry: Entry, program: string): string {
  const body = JSON.stringify({
    savedAt: entry.savedAt,
    issued: entry.issued,
    file: recipeDocument(entry.recipe, program),
  });
  return `${JSON.stringify({ format, version: newest, checksum: checksum(body) })}\n${body}`;
}

/** Reads an entry: header, version, checksum, then the content. Fails with the first problem. */
export function decodeEntry(text: string): Outcome<Entry, EntryProblem> {
  if (text.trim() === '') return fail({ code: 'entry-empty' });
  const split = text.indexOf('\n');
  const header = parseJson(split < 0 ? text : text.slice(0, split));
  if (!header.ok) return fail({ code: 'entry-not-json' });
  const fields = recordOf(header.value);
  if (fields?.format !== format || !isVersion(fields.version)) return fail({ code: 'entry-other-format' });
  if (fields.version > newest) return fail({ code: 'entry-newer-version', version: fields.version, newest });
  const body = split < 0 ? '' : text.slice(split + 1);
  if (fields.checksum !== checksum(body)) return fail({ code: 'entry-checksum' });
  return decodeBody(body);
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

function isVersion(version: unknown): version is number {
  return typeof version === 'number' && Number.isSafeInteger(version) && version >= 1;
}

/** The noted sheet; undefined: not one. */
function issuedOf(value: unknown): Issued | undefined {
  const fields = recordOf(value);
  if (fields === null) return undefined;
  const { revision, contentId } = fields;
  if (typeof revision !== 'number' || !Number.isSafeInteger(revision) || revision < 1) return undefined;
  return typeof contentId === 'string' ? { revision, contentId } : undefined;
}

function recordOf(value: unknown): Readonly<Record<string, unknown>> | null {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
    ? (value as Readonly<Record<string, unknown>>)
    : null;
}
