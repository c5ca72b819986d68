import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import { exceeds } from './pressure-limits.ts';

/** How a stop above the working pressure is judged, and why. */
export type StopJudgement =
  | { readonly verdict: 'hold'; readonly code: 'overfilled' }
  /** Above the mark only because the gas is warm. */
  | { readonly verdict: 'caution'; readonly code: 'warm' }
  | { readonly verdict: 'hold'; readonly code: 'not-computed'; readonly reason: string };

/**
 * The decision of `stop-above-working-pressure` without its words: a stop read on warm gas
 * may stand above the mark without overfilling, if at the `marked` temperature it would not.
 * Pressures absolute; null: not above it.
 */
export function judgeStop(
  stop: { readonly pressure: Pascal; readonly temperature: Kelvin }, limit: Pascal, marked: Kelvin,
  pressureAtMarked: () => Outcome<Pascal, { readonly code: string }>,
): StopJudgement | null {
  if (!exceeds(stop.pressure, limit)) return null;
  if (stop.temperature <= marked) return { verdict: 'hold', code: 'overfilled' };
  const pressure = pressureAtMarked();
  if (!pressure.ok) return { verdict: 'hold', code: 'not-computed', reason: pressure.reason.code };
  return exceeds(pressure.value, limit) ? { verdict: 'hold', code: 'overfilled' } : { verdict: 'caution', code: 'warm' };
}
