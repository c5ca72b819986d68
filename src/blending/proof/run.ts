/** Runs a proof case by case, so that whoever drives it can report progress and stop. */
import type { ProofCase, ProofCounts, ProofGroup, ProofResult } from './case.ts';

/** Each case in its turn, computed when the next result is asked for. */
export function* runProof(groups: readonly ProofGroup[]): Generator<ProofResult, void> {
  for (const { cases } of groups) for (const each of cases) yield judge(each);
}

/** How many cases there are. */
export function proofSize(groups: readonly ProofGroup[]): number {
  return groups.reduce((sum, { cases }) => sum + cases.length, 0);
}

/** Counts of a list of results. */
export function proofCounts(results: readonly ProofResult[]): ProofCounts {
  const within = results.filter((result) => result.within).length;
  return { total: results.length, within, outside: results.length - within };
}

/** Computes one case and holds it against its tolerance; no answer is outside. */
export function judge({ compute, ...statement }: ProofCase): ProofResult {
  const answer = compute();
  if (!answer.ok) return { ...statement, computed: null, reason: answer.reason.code, difference: null, within: false };
  const { published, tolerance } = statement;
  const absolute = answer.value - published;
  const difference = tolerance.kind === 'relative' ? absolute / Math.abs(published) : absolute;
  if (!Number.isFinite(difference)) return { ...statement, computed: null, reason: 'no-number', difference: null, within: false };
  return { ...statement, computed: answer.value, reason: '', difference, within: Math.abs(difference) <= tolerance.value };
}
