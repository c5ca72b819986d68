/** Symmetric: as much probability below as above. Shortest: the narrowest of all, right for what cannot be negative. */
export type IntervalKind = 'symmetric' | 'shortest';

/**
 * Coverage interval from sorted model values (at least two), for a coverage
 * probability inside 0…1: JCGM 101:2008 clause 7.7 (from memory).
 */
export function coverageInterval(sorted: Float64Array, coverage: number, kind: IntervalKind): { low: number; high: number } {
  const count = sorted.length;
  const span = Math.min(count - 1, Math.floor(coverage * count + 0.5));
  if (kind === 'symmetric') {
    const first = Math.floor((count - span) / 2);
    return { low: sorted[first]!, high: sorted[Math.min(count - 1, first + span)]! };
  }
  let best = 0;
  for (let first = 1; first + span < count; first++) {
    if (sorted[first + span]! - sorted[first]! < sorted[best + span]! - sorted[best]!) best = first;
  }
  return { low: sorted[best]!, high: sorted[best + span]! };
}
