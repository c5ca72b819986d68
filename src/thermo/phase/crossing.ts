/** Walks along a path through T and p until the gas begins, or ceases, to be unstable. */
import { fail, ok } from '../../units/index.ts';
import type { Outcome } from '../../units/index.ts';
import type { ThermoReason } from '../contract.ts';
import type { ExcessFollower, ExcessPoint } from './excess.ts';

/** A path: T (K) and p (Pa, absolute) at a parameter. */
export type Path = (u: number) => Outcome<{ readonly temperature: number; readonly pressure: number }, ThermoReason>;

/** How to walk. */
export interface Walk {
  /** A sample with s < 0. */
  readonly start: Sample;
  /** Above the start: u rises. */
  readonly to: number;
  readonly shortest: number;
  readonly longest: number;
}

/** A point of the path with its s. */
export interface Sample extends ExcessPoint {
  readonly u: number;
}

/** |s| at which a crossing counts as found. */
const MET = 1e-12;
/** A summit of s this close below zero is looked at closely: the gas may just touch its dew line. */
const CLOSE_SUMMIT = 0.3;
const MOST_STEPS = 400;

/**
 * Samples a path. Where a path of a closed cylinder has no pressure any more, its
 * gas is past every limit of stability.
 */
export function sampler(follower: ExcessFollower, path: Path): (u: number) => Outcome<Sample, ThermoReason> {
  return (u) => {
    const place = path(u);
    if (!place.ok) {
      if (place.reason.code !== 'equation-breaks-down' && place.reason.code !== 'no-gas-root') return place;
      return ok({ u, temperature: 0, pressure: 0, excess: Infinity, incipient: null, density: null });
    }
    const point = follower.at(place.value.temperature, place.value.pressure);
    return point.ok ? ok({ ...point.value, u }) : point;
  };
}

/**
 * The first u where s rises through zero, or null when it does not up to the end.
 * Steps aim at the crossing by the slope of s, and
 * where s has passed a summit just below zero, the summit itself is sought.
 */
export function firstCrossing(sample: (u: number) => Outcome<Sample, ThermoReason>, walk: Walk): Outcome<Sample | null, ThermoReason> {
  let here = walk.start;
  let before: Sample | null = null;
  for (let step = 0; here.u < walk.to; step++) {
    if (step > MOST_STEPS) return fail({ code: 'not-converged', iterations: step, residual: Math.abs(here.excess) });
    const next = sample(Math.min(walk.to, here.u + stride(before, here, walk)));
    if (!next.ok) return next;
    if (next.value.excess >= 0) return refine(sample, here, next.value);
    if (before !== null && isSummit(before, here, next.value)) {
      const summit = climb(sample, before, here, next.value);
      if (!summit.ok) return summit;
      if (summit.value.excess >= 0) return refine(sample, before.u < summit.value.u ? before : here, summit.value);
    }
    before = here;
    here = next.value;
  }
  return ok(null);
}

/** Step to the zero of the line through the last two samples, within the bounds of the walk. */
function stride(before: Sample | null, here: Sample, { shortest, longest }: Walk): number {
  if (here.excess === -Infinity) return 0.6 * longest;
  if (before === null || before.excess === -Infinity) return Math.min(longest, Math.max(shortest, -here.excess / 2));
  const slope = (here.excess - before.excess) / (here.u - before.u);
  return slope > 0 ? Math.min(longest, Math.max(shortest, -1.02 * here.excess / slope)) : longest;
}

function isSummit(a: Sample, b: Sample, c: Sample): boolean {
  return b.excess > -CLOSE_SUMMIT && b.excess >= a.excess && b.excess >= c.excess;
}

/** Golden section for the summit of s between a and c, given up once it is clear that it stays below zero. */
function climb(sample: (u: number) => Outcome<Sample, ThermoReason>, a: Sample, b: Sample, c: Sample): Outcome<Sample, ThermoReason> {
  let left = a, top = b, right = c;
  for (let step = 0; step < 40 && right.u - left.u > 1e-6 && ceiling(left, top, right) >= -1e-6; step++) {
    const onRight = right.u - top.u > top.u - left.u;
    const tried = sample(onRight ? top.u + 0.38 * (right.u - top.u) : top.u - 0.38 * (top.u - left.u));
    if (!tried.ok) return tried;
    if (tried.value.excess >= 0) return tried;
    if (tried.value.excess > top.excess) {
      if (onRight) left = top;
      else right = top;
      top = tried.value;
    } else if (onRight) right = tried.value;
    else left = tried.value;
  }
  return ok(top);
}

/** What s cannot exceed between three samples around a summit, as it is concave there: their lines, drawn on. */
function ceiling(left: Sample, top: Sample, right: Sample): number {
  const rise = (top.excess - left.excess) / (top.u - left.u);
  const fall = (top.excess - right.excess) / (right.u - top.u);
  const onRight = rise * (right.u - top.u);
  // Where s has no value on the right, the phase has ceased to exist; the left side is then as steep as it was.
  const onLeft = (Number.isFinite(fall) ? fall : rise) * (top.u - left.u);
  return top.excess + Math.max(onLeft, onRight, 0);
}

/**
 * The zero of s between a sample below and one above it (in either order of u): false
 * position after Illinois while both are finite, halving where one is not.
 */
export function refine(sample: (u: number) => Outcome<Sample, ThermoReason>, below: Sample, above: Sample): Outcome<Sample, ThermoReason> {
  let low = below, high = above;
  let lowValue = low.excess, highValue = high.excess;
  let side = 0;
  for (let step = 0; step < 100; step++) {
    const width = Math.abs(high.u - low.u);
    if (width <= 1e-13 * Math.max(1, Math.abs(high.u))) break;
    const finite = Number.isFinite(lowValue) && Number.isFinite(highValue) && step < 60;
    const share = finite ? lowValue / (lowValue - highValue) : 0.5;
    const tried = sample(low.u + share * (high.u - low.u));
    if (!tried.ok) return tried;
    const { excess } = tried.value;
    if (Math.abs(excess) < MET) return tried;
    if (excess > 0) {
      high = tried.value;
      highValue = excess;
      if (side === 1) lowValue /= 2;
      side = 1;
    } else {
      low = tried.value;
      lowValue = excess;
      if (side === -1) highValue /= 2;
      side = -1;
    }
  }
  return ok(high.excess < Infinity ? high : low);
}
