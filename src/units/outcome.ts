/**
 * The answer of anything that can fail: a value, or one named reason.
 *
 * No function of this program answers NaN, -1 or null for "could not". The
 * reason carries a `code` and whatever values a sentence about it needs; the
 * sentences themselves live in `blending/messages`.
 */
export type Outcome<Value, Reason extends { readonly code: string }> =
  | { readonly ok: true; readonly value: Value }
  | { readonly ok: false; readonly reason: Reason };

/** Wraps a value as a successful outcome. */
export function ok<Value>(value: Value): { readonly ok: true; readonly value: Value } {
  return { ok: true, value };
}

/** Wraps a reason as a failed outcome. */
export function fail<Reason extends { readonly code: string }>(
  reason: Reason,
): { readonly ok: false; readonly reason: Reason } {
  return { ok: false, reason };
}
