import { pascal } from '../../../units/index.ts';
import type { Pascal } from '../../../units/index.ts';
import { togetherWords as words } from '../../messages/hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import type { Finding, FindingPlace } from '../finding.ts';
import { allowance, classifyTogether, fuelOxidiserScale, limitingOxygen, pointOf, pressureAllowance, together } from '../fuel-and-oxidiser.ts';
import type { FuelOxidiserPoint, FuelOxidiserScale, LimitingOxygen } from '../fuel-and-oxidiser.ts';
import { usedParents } from '../plan-parts.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showFraction, showPercent, showPressure, showShare, showStated } from '../show.ts';
import { judgeParentMixture, togetherVerdicts } from '../together-judgement.ts';
import { valueIn } from '../../values/value.ts';
import type { LaboratoryValues, RuleValue } from '../../values/value.ts';
import { assumedTolerance, worstCase } from '../worst-case.ts';

const card: RuleCard = {
  id: 'fuel-with-oxidiser',
  title: 'Fuel and oxidiser in the cylinder together, at any step',
  source: 'Margins of 25 % of the lower flammable limit and 60 % of the limiting oxygen concentration; limits of IEC 60079-20-1, NFPA 497, ASTM E2079',
  edition: 'IEC 2010, NFPA 2008, ASTM E2079-19; margins are common practice',
  trust: 'common practice, no source',
};

/**
 * Fuel and oxidiser in one cylinder: what is left in it, every intermediate
 * state, the finished gas at its worst within the tolerances, and each parent.
 */
export const fuelWithOxidiser: HazardRule = { ...card, judge };

/** A parent without a stated pressure is taken as being at cylinder pressure, bar absolute (own choice). */
export const unstatedParent: RuleValue = { id: 'unstated-parent-pressure', value: 200 };

/** One mixture to judge. */
interface Candidate {
  readonly place: FindingPlace;
  readonly where: string;
  readonly point: FuelOxidiserPoint;
  readonly limit: LimitingOxygen;
  readonly pressure: Pascal;
  readonly gauge: string | null;
}

function judge({ plan }: HazardContext): readonly Finding[] {
  const scale = fuelOxidiserScale(plan.job.gases, plan.job.values);
  if (!scale.ok) {
    // Counts as a hold: a fill that may hold fuel with oxidiser was not judged at all.
    const text = words.togetherNotComputed(scale.reason.gas);
    return [finding(card, { verdict: 'hold', place: { kind: 'cylinder' }, words: text, figure: NOT_COMPUTED, limit: NOT_COMPUTED })];
  }
  return [
    ...candidates(plan, scale.value).flatMap((candidate) => judgeState(plan, candidate)),
    ...judgeParents(plan, scale.value),
  ];
}

function candidates(plan: UncheckedPlan, scale: FuelOxidiserScale): readonly Candidate[] {
  const list: Candidate[] = [];
  const add = (place: FindingPlace, where: string, fractions: ArrayLike<number>, pressure: Pascal, gauge: string | null): void => {
    list.push({ place, where, point: pointOf(scale, fractions), limit: limitingOxygen(scale, [fractions]), pressure, gauge });
  };
  if (plan.start) add({ kind: 'cylinder' }, 'before filling', plan.start.fractions, plan.start.pressure, gaugeOfFinish(plan));
  // The state after the last step is the finished gas, judged below with its tolerances.
  for (const { number, state, gauge } of plan.steps.slice(0, -1)) {
    add({ kind: 'step', step: number }, `after step ${number}`, state.fractions, state.pressure, gauge);
  }
  const fuel = worstCase(plan, scale.fuel);
  const oxygen = worstCase(plan, scale.oxygen);
  list.push({
    place: { kind: 'finished gas' },
    where: fuel.toleranceAssumed || oxygen.toleranceAssumed
      ? `in the finished gas at worst, within ${showShare(valueIn(plan.job.values, assumedTolerance))} assumed where no tolerance is ordered`
      : 'in the finished gas at worst within its tolerances',
    point: { fuelOfLfl: fuel.value, oxygen: oxygen.value },
    limit: limitingOxygen(scale, [fuel.fractions]),
    pressure: pascal(Math.max(plan.finished.pressure, plan.steps.at(-1)?.state.pressure ?? 0)),
    gauge: gaugeOfFinish(plan),
  });
  return list;
}

function judgeState(plan: UncheckedPlan, { place, where, point, limit, pressure, gauge }: Candidate): readonly Finding[] {
  const { values } = plan.job;
  const judged = classifyTogether(point, limit, pressure, values);
  if (judged === 'none') return [];
  const fuel = showPercent(point.fuelOfLfl);
  const oxygen = showFraction(point.oxygen);
  const shownPressure = showPressure(plan, pressure, gauge);
  const more = remarks(limit, pressure, values);
  const text = {
    trace: () => words.togetherTrace(where, fuel, oxygen, showShare(valueIn(values, together.traceShare))),
    lean: () => words.togetherLean(where, fuel, oxygen, shownPressure, more),
    hold: () => words.togetherHold(where, fuel, oxygen, shownPressure, more, showShare(valueIn(values, together.fuelShare))),
  }[judged]();
  return [finding(card, {
    verdict: togetherVerdicts[judged],
    place,
    words: text,
    figure: `fuel ${fuel} of its lower flammable limit, oxygen ${oxygen}`,
    limit: shownLimit(limit, pressure, values),
  })];
}

/** Each parent as it stands in its own cylinder. */
function judgeParents(plan: UncheckedPlan, scale: FuelOxidiserScale): readonly Finding[] {
  const { values } = plan.job;
  return usedParents(plan).flatMap((parent) => {
    const point = pointOf(scale, parent.fractions);
    const limit = limitingOxygen(scale, [parent.fractions]);
    const pressure = parent.pressure ?? pascal(valueIn(values, unstatedParent) * 1e5);
    const verdict = judgeParentMixture({ point, limit }, pressure, values);
    if (verdict === null) return [];
    const fuel = showPercent(point.fuelOfLfl);
    const oxygen = showFraction(point.oxygen);
    return [finding(card, {
      verdict,
      place: { kind: 'parent', parent: parent.key },
      words: words.parentMixture(parent.name, fuel, oxygen, verdict === 'hold'),
      figure: `fuel ${fuel} of its lower flammable limit, oxygen ${oxygen}`,
      limit: shownLimit(limit, pressure, values),
    })];
  });
}

function shownLimit(limit: LimitingOxygen, pressure: Pascal, values: LaboratoryValues): string {
  const oxygen = valueIn(values, together.oxygenShare) * limit.fraction * pressureAllowance(pressure, values);
  return `fuel ${showShare(valueIn(values, together.fuelShare))} of its lower flammable limit with oxygen ${showFraction(oxygen)}`;
}

function remarks(limit: LimitingOxygen, pressure: Pascal, values: LaboratoryValues): string {
  const share = pressureAllowance(pressure, values);
  const relied = share === allowance.share.value ? 'half' : showShare(share);
  const half = share < 1
    ? ` Above ${showStated(valueIn(values, allowance.from))} bar absolute only ${relied} of the published limiting oxygen concentration is relied on.` : '';
  const missing = limit.standIn ? ' A limiting oxygen concentration is missing; the lowest of the table stands in for it.' : '';
  return `${half}${missing}`;
}
