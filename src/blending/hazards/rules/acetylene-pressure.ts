import { pascal, toPascal } from '../../../units/index.ts';
import { reactionWords as words } from '../../messages/later-hazards.ts';
import { acetyleneLimit } from '../data/incompatible-pairs.ts';
import type { Finding } from '../finding.ts';
import { exceeds } from '../pressure-limits.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showPressure } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import { largestContent } from './largest-content.ts';

const card: RuleCard = {
  id: 'acetylene-pressure',
  title: 'Partial pressure of acetylene, which decomposes by itself',
  source: 'Trade knowledge: at most 150 kPa absolute as a free gas',
  edition: 'no document read',
  trust: 'common practice, no source',
};

/** Content up to which acetylene cannot reach the limit in any cylinder (own choice). */
const trace = 1e-4;

/** Acetylene in every state and in the finished gas at its worst within the tolerances. */
export const acetylenePressure: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const at = plan.job.gases.indexOf('acetylene');
  const content = plan.finished.fractions[at] ?? 0;
  if (at < 0 || content <= trace) return [];
  const states = [...(plan.start ? [plan.start] : []), ...plan.steps.map((step) => step.state), plan.finished];
  const highest = Math.max(...states.map((state) => (state.fractions[at] ?? 0) * state.pressure));
  const worst = Math.max(highest, largestContent(plan, at) * plan.finished.pressure);
  const limit = pascal(toPascal(valueIn(plan.job.values, acetyleneLimit), 'kPa'));
  const gauge = gaugeOfFinish(plan);
  const show = (partial: number): string => showPressure(plan, pascal(partial), gauge, { reference: 'absolute' });
  const above = exceeds(worst, limit);
  const shown = [show(highest), show(worst), show(limit)] as const;
  return [finding(card, {
    verdict: above ? 'hold' : 'note',
    place: { kind: 'cylinder' },
    words: (above ? words.acetyleneAbove : words.acetyleneBelow)(...shown),
    figure: `${shown[0]} as planned, ${shown[1]} at worst`,
    limit: shown[2],
  })];
}
