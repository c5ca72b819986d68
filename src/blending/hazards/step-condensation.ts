import type { Kelvin, Pascal } from '../../units/index.ts';
import type { GasId } from '../../thermo/index.ts';
import type { PlanPhase, StatePhase } from '../phase/plan-phase.ts';
import type { CylinderState } from '../plan/plan.ts';
import type { Job } from '../recipe/job.ts';
import { mayOverrule, shareVerdict } from './condensation-judgement.ts';
import { condensationLimit } from './condensation-limit.ts';
import { valueIn } from '../values/value.ts';
import type { RuleValue } from '../values/value.ts';

/** The decision of `condensation-at-step` on the state after a step, without its words. */
export type StepCondensation =
  /** The stability test found another phase. */
  | { readonly code: 'separates'; readonly verdict: 'hold' }
  | { readonly code: 'not-computed'; readonly verdict: 'caution'; readonly reason: string }
  /** By the vapour pressure rule alone; `excused`: beyond it, but the tested state is one gas. */
  | { readonly code: 'condenses' | 'excused' | 'near'; readonly verdict: 'caution' | 'hold'; readonly allowed: Pascal };

/**
 * A state with condensable gas and so small a compressibility factor is a
 * liquid stretched below its vapour pressure: gas on its dew line lies above.
 */
export const liquidBelow: RuleValue = { id: 'liquid-compressibility', value: 0.2 };

/** What is asked of the state after a step. */
export type TestedState = Pick<CylinderState, 'fractions' | 'pressure' | 'compressibilityFactor'> & { readonly temperature: Kelvin };

/** Judges a state (absolute pressure) by its tested phase and by the vapour pressure rule; null: nothing to say. */
export function judgeStepCondensation(
  job: Job, guessedPairs: readonly (readonly [GasId, GasId])[], state: TestedState, tested: StatePhase,
): StepCondensation | null {
  if (tested.phase === 'unstable') return { code: 'separates', verdict: 'hold' };
  const isTested = tested.phase !== 'not tested';
  const rule = condensationLimit(job.gases, state.fractions, state.temperature);
  if (!rule.ok) {
    return rule.reason.code === 'no-condensable' || isTested ? null : { code: 'not-computed', verdict: 'caution', reason: rule.reason.code };
  }
  const { limit: allowed } = rule.value;
  const liquid = state.compressibilityFactor < valueIn(job.values, liquidBelow);
  const verdict = liquid ? 'hold' : shareVerdict(state.pressure, allowed, job.values);
  if (verdict === 'note') return null;
  if (verdict === 'caution') return { code: 'near', verdict, allowed };
  const phase: Pick<PlanPhase, 'guessedPairs'> = { guessedPairs };
  return !liquid && isTested && mayOverrule({ job, phase }, state, rule.value)
    ? { code: 'excused', verdict: 'caution', allowed }
    : { code: 'condenses', verdict: 'hold', allowed };
}
