import type { PublishedValue } from '../../values/value.ts';

/**
 * Steps of toxicity of a gas mixture by its LC50 (rat, 1 h), and what they bring
 * with them in transport. The limit of zone B stands with the rule `pressure-at-55`.
 */

const zone = (letter: string, value: number): PublishedValue => ({
  id: `hazard-zone-${letter.toLowerCase()}`, quantity: `Highest LC50 of hazard zone ${letter}`, gas: null, value, unit: 'µmol/mol',
  source: '49 CFR 173.116', trust: 'from memory',
});

export const zoneA = zone('A', 200);
export const zoneC = zone('C', 3000);
export const zoneD = zone('D', 5000);

/** LC50 up to which a cylinder has no pressure relief device. */
export const noReliefUpTo: PublishedValue = {
  id: 'no-relief-device-up-to', quantity: 'LC50 up to which no pressure relief device is allowed', gas: null, value: 200, unit: 'µmol/mol',
  source: 'UN Model Regulations, packing instruction P200, provision k', trust: 'seen',
};

/** Largest water capacity for such a gas. */
export const capacityUpTo: PublishedValue = {
  id: 'capacity-very-toxic', quantity: 'Largest water capacity of a cylinder for such a gas', gas: null, value: 85, unit: 'L',
  source: 'UN Model Regulations, packing instruction P200, provision k', trust: 'seen',
};

export const values: readonly PublishedValue[] = [zoneA, zoneC, zoneD, noReliefUpTo, capacityUpTo];
