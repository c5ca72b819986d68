import { conditioningWords as words } from '../../messages/later-hazards.ts';
import { condensableParent } from '../../phase/liquefied.ts';
import { finding } from '../rule.ts';
import type { HazardRule, RuleCard } from '../rule.ts';
import { purgesOf } from '../purges.ts';
import { showFraction } from '../show.ts';
import { judgeSupply } from '../supply-judgement.ts';
import { tellSupply } from '../supply-words.ts';

const supplyCard: RuleCard = {
  id: 'conditioning-supply',
  title: 'Supply pressure of a purge gas against the upper pressure of its purge',
  source: 'Bench practice: margin of 5 % of the pressure, at least 2 bar or, below 2 bar, as much again',
  edition: 'no document',
  trust: 'common practice, no source',
};

const levelCard: RuleCard = {
  id: 'conditioning-level',
  title: 'Old gas left by a purge against what was asked for',
  source: 'Count of molecules with the real gas and full mixing in each cycle',
  edition: 'this program',
  trust: 'computed',
};

/** A purge gas must stand above the pressure up to which it purges, as a parent above its stop. */
export const conditioningSupply: HazardRule = {
  ...supplyCard,
  judge: ({ plan }) => purgesOf(plan).flatMap(({ number, act, parent }) => {
    const { batch, values } = plan.job;
    const judged = judgeSupply(parent, condensableParent(plan.job, parent), act.high, batch.boosterInlet, values);
    if (judged === null) return [];
    const what = `act ${String(number)} of the conditioning`;
    const aim = judged.needed < act.high ? `the inlet of the booster at ${what}` : `the upper pressure of ${what}`;
    return [finding(supplyCard, {
      verdict: judged.verdict, place: { kind: 'parent', parent: parent.key }, about: `act-${String(number)}`,
      ...tellSupply(plan, parent.name, judged, aim, null),
    })];
  }),
};

/** Where the cycles are typed and a level as well, the cycles are run; whether they reach the level is said here. */
export const conditioningLevel: HazardRule = {
  ...levelCard,
  judge: ({ plan: { job, conditioned } }) => conditioned.flatMap(({ step, cycles, oldGas }) => {
    const act = job.conditioning[step];
    if (act?.kind !== 'purge' || act.wanted === null || !(oldGas > act.wanted)) return [];
    const figure = showFraction(oldGas);
    const limit = showFraction(act.wanted);
    return [finding(levelCard, {
      verdict: 'caution', place: { kind: 'cylinder' }, about: `act-${String(step + 1)}`,
      words: words.levelMissed(step + 1, cycles, figure, limit), figure, limit,
    })];
  }),
};
