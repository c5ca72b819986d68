import { formatTemperature } from '../../../units/index.ts';
import { condensationWords as words } from '../../messages/hazards.ts';
import type { StatePhase } from '../../phase/plan-phase.ts';
import type { CylinderState, PlanStep, UncheckedPlan } from '../../plan/plan.ts';
import { cautionShare, nameOf } from '../condensation-judgement.ts';
import type { Finding, FindingPlace } from '../finding.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showPressure, showShare } from '../show.ts';
import { judgeStepCondensation } from '../step-condensation.ts';
import { valueIn } from '../../values/value.ts';

const card: RuleCard = {
  id: 'condensation-at-step',
  title: 'Condensation in every state of the fill',
  source: 'Tangent-plane stability test of Michelsen, Fluid Phase Equilib. 9 (1982) 1, with the gas model; beside it the vapour pressure rule of ISO 6142:2001, annex on condensation',
  edition: 'rule from memory; margin of 70 % is common practice',
  trust: 'computed',
};

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
  const judged = judgeStepCondensation(plan.job, plan.phase.guessedPairs, state, tested);
  if (judged === null) return [];
  if (judged.code === 'separates') return separation(plan, state, tested, place, `at step ${number}`, gauge);
  const at = formatTemperature(state.temperature);
  if (judged.code === 'not-computed') {
    const text = words.stepNotComputed(number, at, judged.reason);
    return [finding(card, { verdict: judged.verdict, place, words: text, figure: NOT_COMPUTED, limit: NOT_COMPUTED, trust: 'from memory' })];
  }
  const figure = showPressure(plan, state.pressure, gauge);
  const limit = showPressure(plan, judged.allowed, gauge);
  const text = { excused: words.stepAboveRule, condenses: words.stepCondenses, near: words.stepNear }[judged.code];
  const share = showShare(valueIn(plan.job.values, cautionShare));
  return [finding(card, { verdict: judged.verdict, place, words: text(number, figure, limit, at, share), figure, limit, trust: 'from memory' })];
}
