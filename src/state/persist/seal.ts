import { checksum, parseJson } from '../../blending/index.ts';
import { fail, ok, type Outcome } from '../../units/index.ts';

/** Why a stored text is not trusted. It is left as it is. */
export type SealProblem =
  | { readonly code: 'entry-empty' }
  /** No readable first line. */
  | { readonly code: 'entry-not-json' }
  | { readonly code: 'entry-other-format' }
  | { readonly code: 'entry-newer-version'; readonly version: number; readonly newest: number }
  /** Cut off or changed since it was written. */
  | { readonly code: 'entry-checksum' };

/**
 * Puts a first line with format, version and the SHA-256 of the rest before a
 * text. The checksum is over the text as stored, so it can be verified before
 * anything in it is interpreted.
 */
export function seal(format: string, version: number, body: string): string {
  return `${JSON.stringify({ format, version, checksum: checksum(body) })}\n${body}`;
}

/** Reads a sealed text: header, version, checksum. Answers the rest; fails with the first problem. */
export function unseal(text: string, format: string, newest: number): Outcome<string, SealProblem> {
  if (text.trim() === '') return fail({ code: 'entry-empty' });
  const split = text.indexOf('\n');
  const header = parseJson(split < 0 ? text : text.slice(0, split));
  if (!header.ok) return fail({ code: 'entry-not-json' });
  const fields = recordOf(header.value);
  if (fields?.format !== format || !isVersion(fields.version)) return fail({ code: 'entry-other-format' });
  if (fields.version > newest) return fail({ code: 'entry-newer-version', version: fields.version, newest });
  const body = split < 0 ? '' : text.slice(split + 1);
  return fields.checksum === checksum(body) ? ok(body) : fail({ code: 'entry-checksum' });
}

function isVersion(version: unknown): version is number {
  return typeof version === 'number' && Number.isSafeInteger(version) && version >= 1;
}

/** The value as a record; null: it is none. */
export function recordOf(value: unknown): Readonly<Record<string, unknown>> | null {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
    ? (value as Readonly<Record<string, unknown>>)
    : null;
}
