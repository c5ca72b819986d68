import type { CylinderState } from '../plan/plan.ts';
import type { Job } from '../recipe/job.ts';
import { weightedSum } from './gas-ratio.ts';
import type { GasRatio } from './gas-ratio.ts';
import { valueIn } from '../values/value.ts';
import type { RuleValue } from '../values/value.ts';

/**
 * Relative tolerance assumed for a component ordered without one. The trade
 * calls 5 to 10 % usual; the wider end is the cautious one.
 */
export const assumedTolerance: RuleValue = { id: 'assumed-tolerance', value: 0.1 };

/** The composition within the preparation tolerances at which a ratio is largest. */
export interface WorstCase {
  readonly value: number;
  readonly fractions: Float64Array;
  /** Some ordered component had no tolerance and `assumedTolerance` was used for it. */
  readonly toleranceAssumed: boolean;
}

/** What is needed of a plan. */
export interface WorstCaseOf {
  readonly job: Job;
  readonly finished: Pick<CylinderState, 'fractions'>;
}

/**
 * Largest value of a ratio when every ordered component may lie anywhere within
 * its tolerance, the balance component taking up the rest. What was not
 * ordered stays as planned.
 *
 * Changing one component at a time until none helps finds the exact maximum:
 * at such a corner λ the linear form Σ(aᵢ − λbᵢ)xᵢ is 0 and no single change
 * raises it, so no combination does either.
 */
export function worstCase(plan: WorstCaseOf, ratio: GasRatio): WorstCase {
  const { order } = plan.job;
  const assumed = valueIn(plan.job.values, assumedTolerance);
  const fractions = Float64Array.from(plan.finished.fractions);
  const balance = order.components.find((component) => component.isBalance);
  const free = order.components.filter((component) => !component.isBalance && component.nominal > 0);
  const toleranceAssumed = free.some((component) => component.tolerance === null);
  let value = ratioWithBalance(ratio, fractions, balance?.gas);
  // Ends because the value rises strictly and there are finitely many corners.
  let changed = true;
  while (changed) {
    changed = false;
    for (const { gas, nominal, tolerance } of free) {
      const width = tolerance ?? assumed;
      for (const end of [nominal * (1 - width), nominal * (1 + width)]) {
        const kept = fractions[gas] ?? 0;
        fractions[gas] = Math.max(0, end);
        const tried = ratioWithBalance(ratio, fractions, balance?.gas);
        if (tried > value) {
          value = tried;
          changed = true;
        } else fractions[gas] = kept;
      }
    }
  }
  if (balance) fractions[balance.gas] = rest(fractions, balance.gas);
  return { value, fractions, toleranceAssumed };
}

function ratioWithBalance(ratio: GasRatio, fractions: Float64Array, balance: number | undefined): number {
  let over = weightedSum(ratio.over, fractions);
  let under = weightedSum(ratio.under, fractions);
  if (balance !== undefined) {
    const change = rest(fractions, balance) - (fractions[balance] ?? 0);
    over += change * (ratio.over[balance] ?? 0);
    under += change * (ratio.under[balance] ?? 0);
  }
  return over > 0 && under > 0 ? over / under : 0;
}

function rest(fractions: Float64Array, balance: number): number {
  let others = 0;
  for (let i = 0; i < fractions.length; i += 1) if (i !== balance) others += fractions[i] ?? 0;
  return Math.max(0, 1 - others);
}
