import type { Arrangement } from '../plan/arrangement.ts';
import { rejectedSentence } from '../messages/route.ts';
import { compareCosts, decidingCriterion } from './criteria.ts';
import type { Criterion } from './criteria.ts';
import type { JudgedOrder, OrderName, RejectedOrder, RouteFault } from './data.ts';
import { judgeOrder } from './order.ts';
import type { RouteProblem } from './problem.ts';
import type { Search } from './study.ts';
import type { UsualOrder } from './usual-orders.ts';

/** As many as somebody reads. */
const MOST_REJECTED = 5;

/**
 * Orders that were not chosen, each for another reason: first those that people would take, then the
 * best one that breaks each criterion; best first.
 */
export function rejectedOrders(
  problem: RouteProblem, { chosen, unsplit }: Search, usual: readonly UsualOrder[], runnerUp: Arrangement | null,
): readonly RejectedOrder[] {
  const others = [...(runnerUp === null ? [] : [runnerUp]), ...unsplit.bestByBrokenCriterion(unsplit.bestUnits()).values()];
  const candidates: readonly { readonly name: OrderName; readonly arrangement: Arrangement }[] = [
    ...usual, ...others.map((arrangement) => ({ name: 'next best', arrangement }) as const),
  ];
  const seen = new Set([textOf(chosen.arrangement)]);
  const reasons = new Set<string>();
  const rejected: RejectedOrder[] = [];
  for (const { name, arrangement } of candidates) {
    if (rejected.length === MOST_REJECTED || seen.has(textOf(arrangement))) continue;
    seen.add(textOf(arrangement));
    const judged = judgeOrder(problem, arrangement);
    if (!judged.ok) continue;
    const criterion = decidingCriterion(judged.value.cost, chosen.cost);
    // Of time and gas only what decided between the first two is worth a word.
    if (criterion === null || (name === 'next best' && (criterion === 'time' || criterion === 'gas'))) continue;
    const first = firstFault(judged.value, criterion);
    const reason = `${criterion} ${first === null ? '' : reasonOf(first.fault)}`;
    if (reasons.has(reason)) continue;
    reasons.add(reason);
    const parts = { name, criterion, first, ...judged.value };
    rejected.push({ ...parts, sentence: rejectedSentence(problem.job, parts, chosen.cost) });
  }
  return rejected.sort((a, b) => compareCosts(a.cost, b.cost));
}

function textOf(arrangement: Arrangement): string {
  return arrangement.map(({ parent, share }) => `${String(parent)}:${String(share)}`).join(' ');
}

function reasonOf(fault: RouteFault): string {
  return fault.code === 'boundary' ? `${fault.code} ${String(fault.oxidiserEnters)}` : fault.code;
}

/** Where an order first costs something by a criterion; null for a criterion of the whole order. */
function firstFault({ steps }: JudgedOrder, criterion: Criterion): RejectedOrder['first'] {
  for (const [i, { faults }] of steps.entries()) {
    const fault = faults.find((each) => criterionOf(each) === criterion);
    if (fault !== undefined) return { step: i + 1, fault };
  }
  return null;
}

/** The criterion to which a fault counts. */
export function criterionOf({ code, verdict }: RouteFault): Criterion {
  if (code === 'unmeasured') return 'unmeasured';
  if (code === 'not-gas') return 'phase';
  if (code === 'falls' && verdict === 'none') return 'supply';
  return verdict === 'hold' ? 'holds' : 'cautions';
}
