import { findGas, gasIds, gasRecord } from '../thermo/index.ts';
import type { GasId } from '../thermo/index.ts';

/** What a screen or a sheet shows of a gas. */
export interface GasLabel {
  readonly id: GasId;
  /** `carbon dioxide`. */
  readonly name: string;
  /** `CO₂`; isomers with their prefix, `n-C₄H₁₀`. */
  readonly formula: string;
}

/** Isomers share a formula; a label that did not tell them apart would let one be filled for the other. */
const ISOMER_PREFIX: Readonly<Partial<Record<GasId, string>>> = {
  'n-butane': 'n-', isobutane: 'i-', 'n-pentane': 'n-', isopentane: 'i-', neopentane: 'neo-', '1-butene': '1-', isobutene: 'i-',
};

/** Label of one gas. */
export function gasLabel(id: GasId): GasLabel {
  const { name, formulaText } = gasRecord(id);
  return { id, name: name.replace(/[A-Z](?=[a-z])/, (capital) => capital.toLowerCase()), formula: (ISOMER_PREFIX[id] ?? '') + formulaText };
}

/** Every gas that can be computed, in the order of the model. */
export function knownGases(): readonly GasLabel[] {
  return gasIds.map(gasLabel);
}

/** The gas that a typed name, formula, CAS number or synonym means; null when none. */
export function gasFromText(text: string): GasLabel | null {
  const id = findGas(text);
  return id === undefined ? null : gasLabel(id);
}

export type { GasId };
