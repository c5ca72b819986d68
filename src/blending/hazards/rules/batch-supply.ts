import { pascal } from '../../../units/index.ts';
import { batchWords as words } from '../../messages/later-hazards.ts';
import { supplyOf } from '../../supply/index.ts';
import type { ParentSupply } from '../../supply/index.ts';
import { condensableParent } from '../../phase/liquefied.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import type { JobParent } from '../../recipe/job.ts';
import type { Finding, Verdict } from '../finding.ts';
import { parentOf } from '../plan-parts.ts';
import { exceeds } from '../pressure-limits.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { FindingWords, HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showPressure } from '../show.ts';
import { judgeSupply } from '../supply-judgement.ts';

const card: RuleCard = {
  id: 'batch-supply',
  title: 'Whether the parents last for the cylinder and for all of a batch',
  source: 'Gas balance of each parent with the real gas',
  edition: 'this program',
  trust: 'computed',
};

/**
 * Whether each parent holds enough for the cylinder, or for all of a batch. What it stands at before it is
 * opened is `supply-pressure`’s to judge, and enough for a single cylinder whose parents’ contents are not known.
 */
export const batchSupply: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  return supplyOf(plan).parents.flatMap((supply) => {
    const parent = parentOf(plan, supply.parent);
    return parent === undefined ? [] : judgeParent(plan, parent, supply);
  });
}

function judgeParent(plan: UncheckedPlan, parent: JobParent, { supply, highest }: ParentSupply): readonly Finding[] {
  const { batch, values } = plan.job;
  const { cylinders: asked, boosterInlet } = batch;
  const { name } = parent;
  const limit = counted(asked);
  const tell = (verdict: Verdict, text: FindingWords, figure: string, about?: string): Finding =>
    finding(card, { verdict, place: { kind: 'parent', parent: parent.key }, words: text, figure, limit, ...(about === undefined ? {} : { about }) });
  const standsTooLow = judgeSupply(parent, condensableParent(plan.job, parent), highest, boosterInlet, values)?.verdict === 'hold';
  if (!supply.ok) {
    const boosted = !standsTooLow && parent.pressure !== null && exceeds(highest, parent.pressure);
    return [
      ...(asked > 1 ? [tell('caution', words.notComputed(name, asked), NOT_COMPUTED)] : []),
      ...(boosted ? [tell('note', words.onlyBoosted(name, 1), NOT_COMPUTED, 'booster')] : []),
    ];
  }
  const { cylinders, cylindersBoosted, runsOutAt, step, stop } = supply.value;
  if (runsOutAt === null) return [];
  const lasts = cylindersBoosted ?? cylinders;
  const figure = counted(lasts);
  if (lasts >= asked) return [tell('note', words.onlyBoosted(name, runsOutAt), figure)];
  const shown = showPressure(plan, pascal(stop), plan.steps[step - 1]?.gauge ?? null);
  // On one manifold the parent gives to all at once, so none of them is finished.
  if (lasts > 0 && !batch.together) return [tell('caution', words.runsOut(name, lasts + 1, step, shown), figure)];
  return standsTooLow ? [] : [tell('hold', words.cannotFinish(name, batch.together ? asked : 1, step, shown), figure)];
}

function counted(cylinders: number): string {
  return `${String(cylinders)} cylinder${cylinders === 1 ? '' : 's'}`;
}
