/** Gases by key and by what people call them. */
import { kelvin, kilogramPerMole, pascal } from '../units/index.ts';
import type { Kelvin, KilogramPerMole, Pascal } from '../units/index.ts';
import { gasIdentity } from './data/gas-identity.ts';
import { gasIds } from './data/gases.ts';
import type { GasId } from './data/gases.ts';

/** Who a gas is; sources in `data/gas-identity.ts`. */
export interface GasRecord {
  readonly id: GasId;
  readonly name: string;
  /** Plain text: CO2. */
  readonly formula: string;
  /** With subscripts: CO₂. */
  readonly formulaText: string;
  readonly cas: string;
  readonly synonyms: readonly string[];
  /** For weighing: CIAAW 2021 atomic weights. */
  readonly molarMass: { readonly value: KilogramPerMole; readonly standardUncertainty: KilogramPerMole };
  readonly criticalTemperature: Kelvin;
  readonly criticalPressure: Pascal;
  /** Left out where no trusted value was found. */
  readonly triplePoint?: Kelvin;
  /** At 101.325 kPa; a gas that sublimes has none. */
  readonly normalBoilingPoint?: Kelvin;
  readonly acentricFactor: number;
}

const SUBSCRIPTS = '₀₁₂₃₄₅₆₇₈₉';

const records: ReadonlyMap<GasId, GasRecord> = new Map(gasIds.map((id) => [id, makeRecord(id)]));
const byKey = indexNames();

/** The record of a gas. */
export function gasRecord(id: GasId): GasRecord {
  return records.get(id)!;
}

/**
 * The gas that a text names exactly: key, name, formula (CO2 or CO₂), CAS number
 * or synonym, whatever the case and the spaces. A formula that several gases
 * share (C4H10) names none.
 */
export function findGas(text: string): GasId | undefined {
  return byKey.get(normalise(text));
}

function makeRecord(id: GasId): GasRecord {
  const row = gasIdentity[id];
  const [molarMass, uncertainty] = row.molarMass_g_per_mol;
  return {
    id,
    name: row.name,
    formula: row.formula,
    formulaText: row.formula.replace(/\d/g, (digit) => SUBSCRIPTS[Number(digit)]!),
    cas: row.cas,
    synonyms: row.synonyms,
    molarMass: { value: kilogramPerMole(molarMass * 1e-3), standardUncertainty: kilogramPerMole(uncertainty * 1e-3) },
    criticalTemperature: kelvin(row.criticalTemperature_K),
    criticalPressure: pascal(row.criticalPressure_kPa * 1e3),
    ...(row.triplePoint_K === undefined ? {} : { triplePoint: kelvin(row.triplePoint_K) }),
    ...(row.normalBoilingPoint_K === undefined ? {} : { normalBoilingPoint: kelvin(row.normalBoilingPoint_K) }),
    acentricFactor: row.acentricFactor,
  };
}

function indexNames(): ReadonlyMap<string, GasId> {
  const names = new Map<string, GasId>();
  const shared = new Set<string>();
  for (const { id, name, formula, cas, synonyms } of records.values()) {
    for (const key of new Set([id, name, formula, cas, ...synonyms].map(normalise))) {
      if (names.has(key)) shared.add(key);
      names.set(key, id);
    }
  }
  for (const key of shared) names.delete(key);
  return names;
}

function normalise(text: string): string {
  return text
    .replace(/[₀-₉]/g, (digit) => String(SUBSCRIPTS.indexOf(digit)))
    .replace(/\s+/g, '')
    .replace(/[‐‑–]/g, '-')
    .toLowerCase();
}
