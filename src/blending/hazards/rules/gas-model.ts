import { formatNumber } from '../../../units/index.ts';
import type { RangeVerdict } from '../../../thermo/index.ts';
import { compositionWords as words } from '../../messages/later-hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import type { Finding, FindingPlace } from '../finding.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showShare } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import type { RuleValue } from '../../values/value.ts';

const rangeCard: RuleCard = {
  id: 'model-range',
  title: 'Range of the gas model',
  source: 'Kunz and Wagner, J. Chem. Eng. Data 57 (2012) 3032: normal 90 to 450 K up to 35 MPa, extended 60 to 700 K up to 70 MPa',
  edition: 'GERG-2008; range text from memory',
  trust: 'from memory',
};

const pairsCard: RuleCard = {
  id: 'estimated-pairs',
  title: 'Pairs of gases without measurements behind them',
  source: 'Kunz and Wagner, J. Chem. Eng. Data 57 (2012) 3032, Table A8',
  edition: 'GERG-2008',
  trust: 'seen',
};

const cubicCard: RuleCard = {
  id: 'cubic-gas',
  title: 'Gases with a cubic equation only',
  source: 'Peng and Robinson, Ind. Eng. Chem. Fundam. 15 (1976) 59',
  edition: '1976',
  trust: 'seen',
};

const pairingCard: RuleCard = {
  id: 'nitrogen-dioxide-pairs',
  title: 'Nitrogen dioxide pairs up under pressure',
  source: 'NIST-JANAF Thermochemical Tables: 2 NO₂ ⇌ N₂O₄',
  edition: '4th edition, 1998',
  trust: 'computed',
};

/** Content of both gases above which an estimated pair is worth a caution (own choice). */
export const pairMatters: RuleValue = { id: 'estimated-pair-content', value: 0.01 };
/** Content of either gas up to which a pair cannot move a stop (own choice). */
export const pairImmaterial: RuleValue = { id: 'estimated-pair-trace', value: 1e-5 };
/** So many pairs are named; a long list would hide the rest. */
const namedPairs = 4;

/** States outside the range that the authors of the equation give. */
export const modelRange: HazardRule = { ...rangeCard, judge: judgeRange };

/** Pairs that are present and were estimated rather than fitted. */
export const estimatedPairs: HazardRule = { ...pairsCard, judge: judgePairs };

/** Gases whose own equation is the weak part of the model. */
export const cubicGas: HazardRule = { ...cubicCard, judge: judgeCubic };

/** How much of the nitrogen dioxide is dinitrogen tetroxide in the finished cylinder. */
export const nitrogenDioxidePairs: HazardRule = { ...pairingCard, judge: judgePairing };

function judgeCubic({ plan }: HazardContext): readonly Finding[] {
  const content = (gas: string): number => plan.finished.fractions[(plan.job.gases as readonly string[]).indexOf(gas)] ?? 0;
  if (plan.cubicGases.length === 0) return [];
  const matters = valueIn(plan.job.values, pairMatters);
  const important = plan.cubicGases.some((gas) => content(gas) > matters);
  return [finding(cubicCard, {
    verdict: important ? 'caution' : 'note',
    place: { kind: 'finished gas' },
    words: words.cubicGas(plan.cubicGases.join(', '), important, showShare(matters)),
    figure: `${formatNumber(plan.modelUncertainty * 100, 2)} % of pressure, standard uncertainty of the model`,
    limit: 'a reference equation',
  })];
}

function judgePairing({ plan }: HazardContext): readonly Finding[] {
  if (plan.pairedNitrogenDioxide === null) return [];
  const figure = `${formatNumber(plan.pairedNitrogenDioxide * 100, 1)} % of the NO₂ units`;
  return [finding(pairingCard, { verdict: 'note', place: { kind: 'finished gas' }, words: words.nitrogenDioxidePairs(figure), figure, limit: 'none' })];
}

function judgeRange({ plan }: HazardContext): readonly Finding[] {
  const states: { place: FindingPlace; where: string; range: RangeVerdict }[] = [];
  if (plan.start) states.push({ place: { kind: 'cylinder' }, where: 'before filling', range: plan.start.range });
  for (const { number, state } of plan.steps) {
    states.push({ place: { kind: 'step', step: number }, where: `after step ${number}`, range: state.range });
  }
  states.push({ place: { kind: 'finished gas' }, where: 'for the finished gas', range: plan.finished.range });
  return states.flatMap(({ place, where, range }) => {
    if (range === 'normal') return [];
    const outside = range === 'outside';
    return [finding(rangeCard, {
      verdict: outside ? 'caution' : 'note',
      place,
      words: outside ? words.outsideRange(where) : words.extendedRange(where),
      figure: `${range} range`,
      limit: 'normal range',
    })];
  });
}

function judgePairs({ plan }: HazardContext): readonly Finding[] {
  const content = (gas: string): number => plan.finished.fractions[(plan.job.gases as readonly string[]).indexOf(gas)] ?? 0;
  const smaller = ([a, b]: UncheckedPlan['estimatedPairs'][number]): number => Math.min(content(a), content(b));
  const { values } = plan.job;
  const matters = valueIn(values, pairMatters);
  const immaterial = valueIn(values, pairImmaterial);
  const important = plan.estimatedPairs.filter((pair) => smaller(pair) > matters);
  const minor = plan.estimatedPairs.filter((pair) => smaller(pair) > immaterial && smaller(pair) <= matters);
  return [...pairFinding(important, true, showShare(matters)), ...pairFinding(minor, false, showShare(matters))];
}

function pairFinding(pairs: UncheckedPlan['estimatedPairs'], important: boolean, from: string): readonly Finding[] {
  if (pairs.length === 0) return [];
  const named = pairs.slice(0, namedPairs).map(([a, b]) => `${a} with ${b}`).join(', ');
  const list = pairs.length > namedPairs ? `${named} and ${pairs.length - namedPairs} more` : named;
  return [finding(pairsCard, {
    verdict: important ? 'caution' : 'note',
    place: { kind: 'finished gas' },
    about: important ? 'main' : 'minor',
    words: words.estimatedPairs(list, important, from),
    figure: `${pairs.length} estimated`,
    limit: 'all pairs fitted',
  })];
}
