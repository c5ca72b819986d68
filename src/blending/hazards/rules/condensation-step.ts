import { formatTemperature } from '../../../units/index.ts';
import { condensationWords as words } from '../../messages/hazards.ts';
import type { StatePhase } from '../../phase/plan-phase.ts';
import type { CylinderState, PlanStep, UncheckedPlan } from '../../plan/plan.ts';
import { mayOverrule, nameOf, shareVerdict } from '../condensation-judgement.ts';
import { condensationLimit } from '../condensation-limit.ts';
import type { Finding, FindingPlace } from '../finding.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showPressure } from '../show.ts';

const card: RuleCard = {
  id: 'condensation-at-step',
  title: 'Condensation in every state of the fill',
  source: 'Tangent-plane stability test of Michelsen, Fluid Phase Equilib. 9 (1982) 1, with the gas model; beside it the vapour pressure rule of ISO 6142:2001, annex on condensation',
  edition: 'rule from memory; margin of 70 % is common practice',
  trust: 'computed',
};

/**
 * A state with condensable gas and so small a compressibility factor is a
 * liquid stretched below its vapour pressure: gas on its dew line lies above.
 */
const liquidBelow = 0.2;

/** Each state of the fill at its own temperature: what is left, after every step, the finished gas. */
export const condensationAtStep: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const { phase, steps, start, finished } = plan;
  const before = start === null || phase.start === null ? [] : separation(plan, start, phase.start, { kind: 'cylinder' }, 'before filling', null);
  const ofSteps = steps.flatMap((step, i) => judgeStep(plan, step, phase.steps[i] ?? { phase: 'not tested', code: '' }));
  // The last step is the finished gas at its own temperature; it is not said twice.
  const ofFinish = phase.steps.at(-1)?.phase === 'unstable'
    ? [] : separation(plan, finished, phase.finished, { kind: 'finished gas' }, 'in the finished gas', gaugeOfFinish(plan));
  return [...before, ...ofSteps, ...ofFinish];
}

/** A hold where the stability test found another phase. */
function separation(
  plan: UncheckedPlan, state: CylinderState, tested: StatePhase, place: FindingPlace, where: string, gauge: string | null,
): readonly Finding[] {
  if (tested.phase !== 'unstable') return [];
  const { forming } = tested;
  const figure = showPressure(plan, state.pressure, gauge);
  const text = words.stateSeparates(
    where, figure, formatTemperature(state.temperature), forming === null ? null : words.formingName(nameOf(forming.gas), forming.ice),
  );
  return [finding(card, { verdict: 'hold', place, words: text, figure, limit: 'one gas' })];
}

function judgeStep(plan: UncheckedPlan, { number, state, gauge }: PlanStep, tested: StatePhase): readonly Finding[] {
  const place = { kind: 'step', step: number } as const;
  if (tested.phase === 'unstable') return separation(plan, state, tested, place, `at step ${number}`, gauge);
  const at = formatTemperature(state.temperature);
  const isTested = tested.phase !== 'not tested';
  const rule = condensationLimit(plan.job.gases, state.fractions, state.temperature);
  if (!rule.ok) {
    if (rule.reason.code === 'no-condensable' || isTested) return [];
    const text = words.stepNotComputed(number, at, rule.reason.code);
    return [finding(card, { verdict: 'caution', place, words: text, figure: NOT_COMPUTED, limit: NOT_COMPUTED, trust: 'from memory' })];
  }
  const { limit: allowed } = rule.value;
  const liquid = state.compressibilityFactor < liquidBelow;
  const byRule = liquid ? 'hold' : shareVerdict(state.pressure, allowed);
  if (byRule === 'note') return [];
  const figure = showPressure(plan, state.pressure, gauge);
  const limit = showPressure(plan, allowed, gauge);
  const excused = byRule === 'hold' && !liquid && isTested && mayOverrule(plan, state, rule.value);
  const text = excused ? words.stepAboveRule : byRule === 'hold' ? words.stepCondenses : words.stepNear;
  return [finding(card, { verdict: excused ? 'caution' : byRule, place, words: text(number, figure, limit, at), figure, limit, trust: 'from memory' })];
}
