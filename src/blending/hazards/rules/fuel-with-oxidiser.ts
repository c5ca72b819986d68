import { pascal } from '../../../units/index.ts';
import type { Pascal } from '../../../units/index.ts';
import { togetherWords as words } from '../../messages/hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import type { Finding, FindingPlace, Verdict } from '../finding.ts';
import { classifyTogether, fuelOxidiserScale, limitingOxygen, pointOf, pressureAllowance, together } from '../fuel-and-oxidiser.ts';
import type { FuelOxidiserPoint, FuelOxidiserScale, LimitingOxygen, TogetherClass } from '../fuel-and-oxidiser.ts';
import { usedParents } from '../plan-parts.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showFraction, showPercent, showPressure } from '../show.ts';
import { worstCase } from '../worst-case.ts';

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

/** One mixture to judge. */
interface Candidate {
  readonly place: FindingPlace;
  readonly where: string;
  readonly point: FuelOxidiserPoint;
  readonly limit: LimitingOxygen;
  readonly pressure: Pascal;
  readonly gauge: string | null;
}

const verdicts: Readonly<Record<Exclude<TogetherClass, 'none'>, Verdict>> = { trace: 'note', lean: 'caution', hold: 'hold' };

function judge({ plan }: HazardContext): readonly Finding[] {
  const scale = fuelOxidiserScale(plan.job.gases);
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
    where: 'in the finished gas',
    point: { fuelOfLfl: fuel.value, oxygen: oxygen.value },
    limit: limitingOxygen(scale, [fuel.fractions]),
    pressure: pascal(Math.max(plan.finished.pressure, plan.steps.at(-1)?.state.pressure ?? 0)),
    gauge: gaugeOfFinish(plan),
  });
  return list;
}

function judgeState(plan: UncheckedPlan, { place, where, point, limit, pressure, gauge }: Candidate): readonly Finding[] {
  const judged = classifyTogether(point, limit, pressure);
  if (judged === 'none') return [];
  const fuel = showPercent(point.fuelOfLfl);
  const oxygen = showFraction(point.oxygen);
  const shownPressure = showPressure(plan, pressure, gauge);
  const more = remarks(limit, pressure);
  const text = {
    trace: () => words.togetherTrace(where, fuel, oxygen),
    lean: () => words.togetherLean(where, fuel, oxygen, shownPressure, more),
    hold: () => words.togetherHold(where, fuel, oxygen, shownPressure, more),
  }[judged]();
  return [finding(card, {
    verdict: verdicts[judged],
    place,
    words: text,
    figure: `fuel ${fuel} of its lower flammable limit, oxygen ${oxygen}`,
    limit: shownLimit(limit, pressure),
  })];
}

/** A parent that holds both is somebody's finished gas: held only when it could burn as it is. */
function judgeParents(plan: UncheckedPlan, scale: FuelOxidiserScale): readonly Finding[] {
  return usedParents(plan).flatMap((parent) => {
    const point = pointOf(scale, parent.fractions);
    const limit = limitingOxygen(scale, [parent.fractions]);
    // A parent without a stated pressure is taken as being at cylinder pressure.
    const pressure = parent.pressure ?? pascal(200e5);
    const judged = classifyTogether(point, limit, pressure);
    if (judged === 'none' || judged === 'trace') return [];
    const burns = point.fuelOfLfl >= 1 && judged === 'hold';
    const fuel = showPercent(point.fuelOfLfl);
    const oxygen = showFraction(point.oxygen);
    return [finding(card, {
      verdict: burns ? 'hold' : 'caution',
      place: { kind: 'parent', parent: parent.key },
      words: words.parentMixture(parent.name, fuel, oxygen, burns),
      figure: `fuel ${fuel} of its lower flammable limit, oxygen ${oxygen}`,
      limit: shownLimit(limit, pressure),
    })];
  });
}

function shownLimit(limit: LimitingOxygen, pressure: Pascal): string {
  const oxygen = together.oxygenShare * limit.fraction * pressureAllowance(pressure);
  return `fuel ${showPercent(together.fuelShare, 0)} of its lower flammable limit with oxygen ${showFraction(oxygen)}`;
}

function remarks(limit: LimitingOxygen, pressure: Pascal): string {
  const half = pressureAllowance(pressure) < 1 ? ' Above 10 bar absolute only half of the published limiting oxygen concentration is relied on.' : '';
  const missing = limit.standIn ? ' A limiting oxygen concentration is missing; the lowest of the table stands in for it.' : '';
  return `${half}${missing}`;
}
