import type { Arrangement } from '../plan/arrangement.ts';
import { sequenceOfAdditions } from '../plan/sequence.ts';
import type { OrderName } from './data.ts';
import type { RouteParent } from './parents.ts';
import type { RouteProblem } from './problem.ts';

/** An order that somebody might take without a study. */
export interface UsualOrder {
  readonly name: Exclude<OrderName, 'next best'>;
  readonly arrangement: Arrangement;
}

/** A parent with at least this much oxygen counts as an oxidiser for the name of an order, one at this share of its lower flammable limit as a fuel. */
const OXIDISER = 0.02;
const FUEL = 0.25;

/** The orders that people know by name, for this fill. */
export function usualOrders({ job, amounts, parents }: RouteProblem): readonly UsualOrder[] {
  const smallest = sequenceOfAdditions(job, amounts.additions, 'smallest first');
  const orders: UsualOrder[] = [
    { name: 'smallest first', arrangement: smallest },
    { name: 'as listed', arrangement: sequenceOfAdditions(job, amounts.additions, 'as listed') },
    { name: 'balance first', arrangement: [smallest.at(-1)!, ...smallest.slice(0, -1)] },
  ];
  const isFuel = ({ meeting }: RouteParent): boolean => meeting !== null && meeting.point.fuelOfLfl >= FUEL;
  const isOxidiser = (parent: RouteParent): boolean => !isFuel(parent) && parent.meeting !== null && parent.meeting.point.oxygen >= OXIDISER;
  const fuels = parents.filter(isFuel);
  const oxidisers = parents.filter(isOxidiser);
  if (fuels.length === 0 || oxidisers.length === 0) return orders;
  const rest = parents.filter((parent) => !isFuel(parent) && !isOxidiser(parent));
  const inTurn = (...groups: readonly (readonly RouteParent[])[]): Arrangement => groups.flat().map(({ index }) => ({ parent: index, share: 1 }));
  return [
    ...orders,
    { name: 'fuel, then oxidiser', arrangement: inTurn(fuels, oxidisers, rest) },
    { name: 'oxidiser, then fuel', arrangement: inTurn(oxidisers, fuels, rest) },
  ];
}
