import { formatTemperature } from '../../units/index.ts';
import { instrumentWords as words } from '../messages/hazards.ts';
import type { UncheckedPlan } from '../plan/plan.ts';
import { NOT_COMPUTED } from './rule.ts';
import type { FindingParts } from './rule.ts';
import { showPressure } from './show.ts';
import type { SupplyJudgement } from './supply-judgement.ts';

const gasWords = { 'too-low': words.supplyTooLow, margin: words.supplyMargin, 'not-stated': words.supplyNotStated };

const liquefiedWords = { 'too-low': words.liquefiedTooLow, margin: words.liquefiedMargin, 'not-stated': words.liquefiedNotStated };

/** What is said of a parent that does not stand high enough for its `aim`, in the terms of a gauge. */
export function tellSupply(
  plan: UncheckedPlan, name: string, { code, liquefied, pressure, needed }: SupplyJudgement, aim: string, gauge: string | null,
): Pick<FindingParts, 'words' | 'figure' | 'limit'> {
  const limit = showPressure(plan, needed, gauge);
  const figure = pressure === null ? NOT_COMPUTED : showPressure(plan, pressure, gauge);
  const said = liquefied
    ? liquefiedWords[code]({ name, figure, stop: limit, aim, at: formatTemperature(plan.job.conditions.roomTemperature) })
    : gasWords[code](name, figure, limit, aim);
  return { words: said, figure, limit };
}
