import { pascal } from '../../../units/index.ts';
import { batchWords as words } from '../../messages/later-hazards.ts';
import { supplyOf } from '../../supply/index.ts';
import type { ParentSupply } from '../../supply/index.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import type { Finding } from '../finding.ts';
import { parentOf } from '../plan-parts.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showPressure } from '../show.ts';

const card: RuleCard = {
  id: 'batch-supply',
  title: 'Whether the parents last for all cylinders of a batch',
  source: 'Gas balance of each parent with the real gas',
  edition: 'this program',
  trust: 'computed',
};

/** Several identical cylinders from the same parents; a single one is judged by `supply-pressure`. */
export const batchSupply: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  return plan.job.batch.cylinders > 1 ? supplyOf(plan).parents.flatMap((parent) => judgeParent(plan, parent)) : [];
}

function judgeParent(plan: UncheckedPlan, { parent, supply }: ParentSupply): readonly Finding[] {
  const place = { kind: 'parent', parent } as const;
  const name = parentOf(plan, parent)?.name ?? parent;
  const asked = plan.job.batch.cylinders;
  const limit = `${String(asked)} cylinders`;
  if (!supply.ok) return [finding(card, { verdict: 'caution', place, words: words.notComputed(name, asked), figure: NOT_COMPUTED, limit })];
  const { cylinders, cylindersBoosted, runsOutAt, step, stop } = supply.value;
  if (runsOutAt === null) return [];
  const lasts = cylindersBoosted ?? cylinders;
  const figure = `${String(lasts)} cylinder${lasts === 1 ? '' : 's'}`;
  const shown = showPressure(plan, pascal(stop), plan.steps[step - 1]?.gauge ?? null);
  if (lasts >= asked) return [finding(card, { verdict: 'note', place, words: words.onlyBoosted(name, runsOutAt), figure, limit })];
  return [finding(card, { verdict: 'caution', place, words: words.runsOut(name, lasts + 1, step, shown), figure, limit })];
}
