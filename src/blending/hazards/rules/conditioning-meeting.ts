import { conditioningWords as words } from '../../messages/later-hazards.ts';
import { togetherWords } from '../../messages/hazards.ts';
import type { Pascal } from '../../../units/index.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import type { Finding } from '../finding.ts';
import { classifyTogether, fuelOxidiserScale, pressureAllowance, together } from '../fuel-and-oxidiser.ts';
import type { FuelOxidiserScale } from '../fuel-and-oxidiser.ts';
import { fractionsOf, purgesOf } from '../purges.ts';
import type { Purge } from '../purges.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showFraction, showPercent, showPressure, showShare, showStated } from '../show.ts';
import { harmlessPressure, judgeBoundary, meetingGas, togetherVerdicts } from '../together-judgement.ts';
import { valueIn } from '../../values/value.ts';

const card: RuleCard = {
  id: 'conditioning-fuel-and-oxidiser',
  title: 'Fuel and oxidiser during a purge',
  source: 'Principle of EIGA 39 and EIGA 139 (judge every intermediate state); limits of IEC 60079-20-1, NFPA 497, ASTM E2079',
  edition: 'principle and margins as for the steps; IEC 2010, NFPA 2008, ASTM E2079-19',
  trust: 'common practice, no source',
};

/**
 * What was in the cylinder before it is purged, the boundary where the purge gas streams in, and the mixture
 * at the upper pressure, each as in a step. The first cycle meets the most of the old gas, so it stands for all.
 */
export const conditioningFuelAndOxidiser: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const scale = fuelOxidiserScale(plan.job.gases, plan.job.values);
  const purges = purgesOf(plan);
  // A gas without data is already held by `fuel-with-oxidiser`.
  if (!scale.ok || purges.length === 0) return [];
  const found = fractionsOf(plan.conditioned[0]!.before);
  return [
    ...(found === null ? [] : judgeMixture(plan, scale.value, found, plan.job.cylinder.contents.pressure, 'in what is found in the cylinder', 'found')),
    ...purges.flatMap((purge) => judgePurge(plan, scale.value, purge)),
  ];
}

function judgePurge(plan: UncheckedPlan, scale: FuelOxidiserScale, { number, act, parent, inside, low, atHigh }: Purge): readonly Finding[] {
  if (inside === null) return [];
  const { gases, values } = plan.job;
  const meeting = meetingGas(gases, scale, inside);
  const judged = judgeBoundary(meeting, meetingGas(gases, scale, parent.fractions), low, act.high, values);
  const mixed = judgeMixture(plan, scale, fractionsOf(atHigh)!, act.high, `during the purge with ${parent.name} (act ${String(number)})`, `act-${String(number)}-mixed`);
  if (judged === null) return mixed;
  const { verdict, oxidiserEnters, fuelSide, oxygenSide, oxygenLimit } = judged;
  return [finding(card, {
    verdict,
    place: { kind: 'cylinder' },
    about: `act-${String(number)}-boundary`,
    words: words.boundary(verdict, number, parent.name, oxidiserEnters, showPressure(plan, low, null, { reference: 'absolute' }), `${showStated(valueIn(values, harmlessPressure))} mbar absolute`),
    figure: `fuel side ${showPercent(fuelSide.fuelOfLfl)} of the lower flammable limit, oxidiser side ${showFraction(oxygenSide.oxygen)} oxygen`,
    limit: `fuel 100 % of its lower flammable limit with oxygen ${showFraction(oxygenLimit)}`,
  }), ...mixed];
}

function judgeMixture(
  plan: UncheckedPlan, scale: FuelOxidiserScale, fractions: Float64Array, pressure: Pascal, where: string, about: string,
): readonly Finding[] {
  const { gases, values } = plan.job;
  const { point, limit } = meetingGas(gases, scale, fractions);
  const judged = classifyTogether(point, limit, pressure, values);
  if (judged === 'none') return [];
  const fuel = showPercent(point.fuelOfLfl);
  const oxygen = showFraction(point.oxygen);
  const share = showShare(valueIn(values, together.fuelShare));
  const shown = showPressure(plan, pressure, null);
  const text = {
    trace: () => togetherWords.togetherTrace(where, fuel, oxygen, showShare(valueIn(values, together.traceShare))),
    lean: () => togetherWords.togetherLean(where, fuel, oxygen, shown, ''),
    hold: () => togetherWords.togetherHold(where, fuel, oxygen, shown, '', share),
  }[judged]();
  const oxygenShare = valueIn(values, together.oxygenShare) * limit.fraction * pressureAllowance(pressure, values);
  return [finding(card, {
    verdict: togetherVerdicts[judged],
    place: { kind: 'cylinder' },
    about,
    words: text,
    figure: `fuel ${fuel} of its lower flammable limit, oxygen ${oxygen}`,
    limit: `fuel ${share} of its lower flammable limit with oxygen ${showFraction(oxygenShare)}`,
  })];
}
