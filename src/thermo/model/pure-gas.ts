/** One gas of the mixture, whatever publication its equation comes from. */
import { GAS_CONSTANT } from '../constants.ts';
import { gasIdentity } from '../data/gas-identity.ts';
import type { GasId } from '../data/gases.ts';
import { idealGasParts } from '../data/kunz-wagner-2012/ideal.ts';
import type { KunzWagnerGas } from '../data/kunz-wagner-2012/gases.ts';
import { pureEquation } from '../data/kunz-wagner-2012/pure.ts';
import type { EquationRange, HeatCapacity, HelmholtzEquation, IdealGasPart, PengRobinsonRow } from '../records.ts';
import { helmholtzTerms, PENG_ROBINSON_CRITICAL_Z, pengRobinsonTerms } from '../terms/published-terms.ts';
import { pureTerms } from '../terms/term-table.ts';
import type { Term } from '../terms/term-table.ts';
import { equationsBeyondGerg } from './library.ts';

/** What the mixture model needs of a gas. */
export interface PureGas {
  readonly equation: 'GERG-2008' | 'Helmholtz' | 'Peng–Robinson';
  /** K. */
  readonly reducingTemperature: number;
  /** m³/mol. */
  readonly reducingVolume: number;
  /** As published with the equation, kg/mol. */
  readonly molarMass: number;
  readonly terms: readonly Term[];
  readonly ideal: IdealGasPart | HeatCapacity;
  /** The range stated for the equation alone; left out where it is that of GERG-2008, or where none is stated. */
  readonly range?: EquationRange;
}

const assembled = new Map<GasId, PureGas>();

/** A gas whose equations are loaded, assembled once. */
export function pureGas(id: GasId): PureGas {
  const known = assembled.get(id);
  if (known) return known;
  const gas = assemble(id);
  assembled.set(id, gas);
  return gas;
}

function assemble(id: GasId): PureGas {
  if (isKeyOf(idealGasParts, id)) return kunzWagnerGas(id);
  const { helmholtz, pengRobinson, publications } = equationsBeyondGerg()!;
  return isKeyOf(helmholtz, id) ? helmholtzGas(helmholtz[id], publications[id].range) : pengRobinsonGas(pengRobinson[id], gasIdentity[id].molarMass_g_per_mol[0]);
}

function isKeyOf<Key extends string>(table: Readonly<Record<Key, unknown>>, id: string): id is Key {
  return Object.hasOwn(table, id);
}

function kunzWagnerGas(id: KunzWagnerGas): PureGas {
  const equation = pureEquation(id);
  return {
    equation: 'GERG-2008',
    reducingTemperature: equation.criticalTemperature_K,
    reducingVolume: 1e-3 / equation.criticalDensity_mol_per_dm3,
    molarMass: equation.molarMass_g_per_mol * 1e-3,
    terms: pureTerms(equation),
    ideal: idealGasParts[id],
  };
}

function helmholtzGas(equation: HelmholtzEquation, range: EquationRange): PureGas {
  return {
    equation: 'Helmholtz',
    reducingTemperature: equation.reducingTemperature_K,
    reducingVolume: 1e-3 / equation.reducingDensity_mol_per_dm3,
    molarMass: equation.molarMass_g_per_mol * 1e-3,
    terms: helmholtzTerms(equation),
    ideal: equation.heatCapacity,
    range,
  };
}

function pengRobinsonGas(row: PengRobinsonRow, molarMass_g_per_mol: number): PureGas {
  const { criticalTemperature_K: temperature, criticalPressure_kPa: pressure, acentricFactor, heatCapacity } = row;
  return {
    equation: 'Peng–Robinson',
    reducingTemperature: temperature,
    reducingVolume: PENG_ROBINSON_CRITICAL_Z * GAS_CONSTANT * temperature / (pressure * 1e3),
    molarMass: molarMass_g_per_mol * 1e-3,
    terms: pengRobinsonTerms(acentricFactor),
    ideal: heatCapacity,
  };
}
