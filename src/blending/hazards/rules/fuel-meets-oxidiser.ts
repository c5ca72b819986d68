import { togetherWords as words } from '../../messages/hazards.ts';
import type { CylinderState, PlanStep, UncheckedPlan } from '../../plan/plan.ts';
import type { JobParent } from '../../recipe/job.ts';
import type { Finding } from '../finding.ts';
import { fuelOxidiserScale } from '../fuel-and-oxidiser.ts';
import type { FuelOxidiserScale } from '../fuel-and-oxidiser.ts';
import { parentOf, stateBefore } from '../plan-parts.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showFraction, showPercent, showPressure, showStated } from '../show.ts';
import { harmlessPressure, judgeBoundary, meetingGas } from '../together-judgement.ts';
import { valueIn } from '../../values/value.ts';

const card: RuleCard = {
  id: 'fuel-meets-oxidiser',
  title: 'Oxidiser let into fuel, or fuel into oxidiser',
  source: 'Principle of EIGA 39 and EIGA 139 (judge every intermediate state); limits of IEC 60079-20-1, NFPA 497, ASTM E2079',
  edition: 'principle from memory; IEC 2010, NFPA 2008, ASTM E2079-19',
  trust: 'common practice, no source',
};

/**
 * Judges the boundary between the gas in the cylinder and the gas streaming
 * in. While they mix, every ratio of the two exists somewhere, so a harmless
 * mixed state does not excuse a flammable one on the way.
 *
 * Held when some ratio has the fuel at its lower flammable limit and the oxygen
 * at its limiting concentration together. The flammability test of ISO 10156 is
 * a second reason to hold, never an excuse: it asks about air, and fuel too
 * dilute for air (methane 8 % in nitrogen) burns with pure oxygen.
 */
export const fuelMeetsOxidiser: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const scale = fuelOxidiserScale(plan.job.gases, plan.job.values);
  // A gas without data is already held by `fuel-with-oxidiser`.
  if (!scale.ok) return [];
  return plan.steps.flatMap((step) => {
    const parent = parentOf(plan, step.parent);
    const before = stateBefore(plan, step.number);
    return parent && before ? judgeStep(plan, scale.value, step, parent, before) : [];
  });
}

function judgeStep(
  plan: UncheckedPlan, scale: FuelOxidiserScale, step: PlanStep, parent: JobParent, before: CylinderState,
): readonly Finding[] {
  const { gases, values } = plan.job;
  const inside = meetingGas(gases, scale, before.fractions);
  const judged = judgeBoundary(inside, meetingGas(gases, scale, parent.fractions), before.pressure, step.state.pressure, values);
  if (judged === null) return [];
  const { verdict, oxidiserEnters, fuelSide, oxygenSide, oxygenLimit } = judged;
  const inCylinder = `${oxidiserEnters ? `fuel at ${showPercent(inside.point.fuelOfLfl)} of its lower flammable limit` : `oxygen ${showFraction(inside.point.oxygen)}`}, ${showPressure(plan, before.pressure, step.gauge)}`;
  const text = { note: words.boundaryTrace, hold: words.boundaryHold, caution: words.boundaryLean }[verdict];
  return [finding(card, {
    verdict,
    place: { kind: 'step', step: step.number },
    words: text(step.number, parent.name, oxidiserEnters, inCylinder, `${showStated(valueIn(values, harmlessPressure))} mbar absolute`),
    figure: `fuel side ${showPercent(fuelSide.fuelOfLfl)} of the lower flammable limit, oxidiser side ${showFraction(oxygenSide.oxygen)} oxygen`,
    limit: `fuel 100 % of its lower flammable limit with oxygen ${showFraction(oxygenLimit)}`,
  })];
}
