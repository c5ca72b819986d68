import { values as classLimits } from '../classification/limits.ts';
import { values as acuteToxicity } from '../data/acute-toxicity.ts';
import { values as dangerousRoomAir } from '../data/dangerous-room-air.ts';
import { values as fillingLimits } from '../data/filling-limits.ts';
import { values as hazardZones } from '../data/hazard-zones.ts';
import { values as incompatiblePairs } from '../data/incompatible-pairs.ts';
import { values as metals } from '../data/metals.ts';
import { listed, valueSections } from './listed.ts';
import type { ListedValue } from './listed.ts';
import { equivalencyValues, flammabilityValues, toxicityValues } from './tables.ts';
import { thresholdValues } from './thresholds.ts';

const all: readonly ListedValue[] = [
  ...thresholdValues(), ...flammabilityValues(), ...equivalencyValues(), ...toxicityValues(),
  ...listed('Toxicity', hazardZones), ...listed('Filling limits', fillingLimits),
  ...listed('Suggested class', classLimits), ...listed('Suggested class', acuteToxicity),
  ...listed('Reactions and metals', incompatiblePairs), ...listed('Reactions and metals', metals), ...listed('Room air', dangerousRoomAir),
];
const inOrder = valueSections.flatMap((section) => byQuantity(all.filter((value) => value.section === section)));
const byId: ReadonlyMap<string, ListedValue> = new Map(inOrder.map((value) => [value.id, value]));

/** Equal quantities together, in the order in which each is met first. */
function byQuantity(values: readonly ListedValue[]): readonly ListedValue[] {
  return [...new Set(values.map(({ quantity }) => quantity))].flatMap((quantity) => values.filter((value) => value.quantity === quantity));
}

/** Every coefficient, limit and threshold behind a rule, section by section. */
export function publishedValues(): readonly ListedValue[] {
  return inOrder;
}

/** The published value of an id, or undefined when no rule knows it. */
export function publishedValue(id: string): ListedValue | undefined {
  return byId.get(id);
}
