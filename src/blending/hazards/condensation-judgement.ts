import type { GasId } from '../../thermo/index.ts';
import { gasLabel } from '../gases.ts';
import type { CylinderState, UncheckedPlan } from '../plan/plan.ts';
import type { RuleLimit } from './condensation-limit.ts';
import type { Finding } from './finding.ts';
import { exceeds } from './pressure-limits.ts';
import { valueIn } from '../values/value.ts';
import type { LaboratoryValues, RuleValue } from '../values/value.ts';

/** Share of a condensation limit from which a caution is given. */
export const cautionShare: RuleValue = { id: 'condensation-caution-share', value: 0.7 };

/** A gas with more than this is part of what a condensing gas is dissolved in (own choice). */
export const solventContent: RuleValue = { id: 'solvent-content', value: 0.05 };

/** Verdict of a pressure on a limit; both absolute, as the vapour pressure rule asks. */
export function shareVerdict(pressure: number, limit: number, values: LaboratoryValues): Finding['verdict'] {
  if (exceeds(pressure, limit)) return 'hold';
  return pressure > valueIn(values, cautionShare) * limit ? 'caution' : 'note';
}

/**
 * Whether a computed dew point may excuse a state that breaks the vapour pressure
 * rule. It may not where a condensing gas and what it is mixed with were never
 * measured together, nor for moisture, which the equations describe too kindly in
 * compressed gas: GERG-2008 has −72 cm³/mol for the cross virial coefficient of water
 * and nitrogen at 25 °C, measured is about −40 (value from memory).
 */
export function mayOverrule(plan: { readonly job: UncheckedPlan['job']; readonly phase: Pick<UncheckedPlan['phase'], 'guessedPairs'> }, state: Pick<CylinderState, 'fractions' | 'pressure'>, rule: RuleLimit): boolean {
  const { values } = plan.job;
  if (state.pressure > valueIn(values, cautionShare) * rule.waterLimit) return false;
  const solvent = valueIn(values, solventContent);
  const content = (gas: GasId): number => state.fractions[plan.job.gases.indexOf(gas)] ?? 0;
  const guessed = (condensing: GasId, other: GasId): boolean => rule.main.includes(condensing) && content(other) > solvent;
  return !plan.phase.guessedPairs.some(([first, second]) => content(first) > 0 && content(second) > 0 && (guessed(first, second) || guessed(second, first)));
}

/** A gas by its name in running text. */
export function nameOf(gas: GasId): string {
  return gasLabel(gas).name;
}
