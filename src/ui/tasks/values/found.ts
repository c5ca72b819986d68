import { searchGases } from '../../../blending/index.ts';
import type { LaboratoryValue, ListedValue } from '../../../blending/index.ts';

/** Values that stand under one quantity. */
export interface ValueGroup {
  readonly quantity: string;
  readonly values: readonly ListedValue[];
}

/** Which values are wanted: words of the quantity, or a gas by whatever it is called; empty: all. */
export function foundValues(list: readonly ListedValue[], text: string, own: readonly LaboratoryValue[], onlyOwn: boolean): readonly ListedValue[] {
  const wanted = text.trim().toLowerCase();
  const gases: ReadonlySet<string> = new Set(wanted === '' ? [] : searchGases(wanted).map(({ gas }) => gas.id));
  const replaced = new Set(own.map(({ id }) => id));
  return list.filter(({ id, gas, quantity, section }) =>
    (!onlyOwn || replaced.has(id))
    && (wanted === '' || (gas !== null && gases.has(gas)) || `${section} ${quantity}`.toLowerCase().includes(wanted)));
}

/** Values of one section by their quantity, in the order of the list. */
export function groupedValues(list: readonly ListedValue[]): readonly ValueGroup[] {
  return [...new Set(list.map(({ quantity }) => quantity))].map((quantity) => ({ quantity, values: list.filter((value) => value.quantity === quantity) }));
}

/** A value of the list as shown; the unit is that of the published one. */
export function valueText(value: number | string, unit: string): string {
  return unit === '' ? String(value) : `${String(value)} ${unit}`;
}
