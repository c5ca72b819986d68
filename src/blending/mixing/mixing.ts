import { fail, mole, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Mole, Outcome, Pascal } from '../../units/index.ts';
import type { ThermoModel, ThermoReason, ThermoState } from '../../thermo/index.ts';
import type { Job } from '../recipe/job.ts';
import type { StandardPressure } from '../recipe/document.ts';
import type { FillAmounts } from '../plan/amounts.ts';
import type { CylinderState } from '../plan/plan.ts';

/** Standard pressures, Pa: IUPAC since 1982, and the atmosphere used before. */
export const STANDARD_PRESSURE: Readonly<Record<StandardPressure, Pascal>> = {
  '1 bar': pascal(100_000),
  '1 atm': pascal(101_325),
};

/** A change split by cause; the three parts add up to the total. Totals for the whole cylinder. */
export interface MixingSplit {
  readonly total: number;
  /** Of mixing alone, as ideal gases at one T and p: RT Σ nᵢ ln(xᵢ/yᵢ) or −R Σ nᵢ ln(xᵢ/yᵢ). */
  readonly ideal: number;
  /** Of going from each parent's pressure to the blend's, as ideal gases. */
  readonly pressure: number;
  /** What real-gas behaviour adds. */
  readonly realGas: number;
}

/** Chemical potential of one gas in the blend against its standard state, μᵢ − μᵢ° = RT ln(xᵢφᵢp/p°), J/mol. */
export interface ChemicalPotential {
  /** Index into `Job.gases`. */
  readonly gas: number;
  readonly relative: number;
  readonly idealMixing: number;
  readonly pressure: number;
  readonly realGas: number;
}

/** Where one source of gas stood before it went into the cylinder. */
export interface MixingSource {
  /** Parent key; null for the residual. */
  readonly parent: string | null;
  readonly amount: Mole;
  readonly pressure: Pascal;
  /** The parent's pressure was not stated: the blend's own pressure was used. */
  readonly assumed: boolean;
}

/** Entropy and Gibbs energy of going from the parents to the blend at the blend's temperature. */
export interface Mixing {
  readonly temperature: Kelvin;
  readonly pressure: Pascal;
  readonly standardPressure: Pascal;
  readonly amount: Mole;
  /** J. */
  readonly gibbsEnergy: MixingSplit;
  /** J/K. */
  readonly entropy: MixingSplit;
  /** J; zero for ideal gases. */
  readonly enthalpy: number;
  readonly potentials: readonly ChemicalPotential[];
  readonly sources: readonly MixingSource[];
}

/** Why the change cannot be stated. */
export interface MixingProblem {
  readonly code: 'mixing-state';
  /** Parent key, `residual` or `blend`. */
  readonly source: string;
  readonly reason: ThermoReason;
}

export type MixingResult = Outcome<Mixing, MixingProblem>;

interface Source {
  readonly key: string | null;
  readonly amount: number;
  readonly fractions: Float64Array;
  readonly pressure: Pascal;
  readonly assumed: boolean;
}

/**
 * ΔG = Σ nᵢ [μᵢ(T, p, x) − μᵢ(parent)] and ΔS likewise, every state at the
 * blend's temperature, μᵢ = μᵢ° + RT ln(xᵢφᵢp/p°). The standard pressure p°
 * cancels from the changes and shows only in the chemical potentials.
 */
export function mixingOfFill(job: Job, model: ThermoModel, amounts: FillAmounts, finished: CylinderState): MixingResult {
  const { temperature, pressure, fractions, total } = finished;
  const blend = model.state(temperature, finished.density, fractions);
  if (!blend.ok) return fail({ code: 'mixing-state', source: 'blend', reason: blend.reason });
  const R = model.gasConstant;
  const sources = sourcesOf(job, amounts, pressure);
  let idealEntropy = 0;
  let pressureEntropy = 0;
  let sourceEntropy = 0;
  let sourceEnthalpy = 0;
  for (const source of sources) {
    const before = model.stateAtPressure(temperature, source.pressure, source.fractions);
    if (!before.ok) return fail({ code: 'mixing-state', source: source.key ?? 'residual', reason: before.reason });
    idealEntropy -= R * source.amount * sumXLogRatio(source.fractions, fractions);
    pressureEntropy -= R * source.amount * Math.log(pressure / source.pressure);
    sourceEntropy += source.amount * before.value.residualEntropy;
    sourceEnthalpy += source.amount * before.value.residualEnthalpy;
  }
  const realEntropy = total * blend.value.residualEntropy - sourceEntropy;
  const enthalpy = total * blend.value.residualEnthalpy - sourceEnthalpy;
  const entropy = split(idealEntropy, pressureEntropy, realEntropy);
  const standardPressure = STANDARD_PRESSURE[job.conditions.standardPressure];
  return ok({
    temperature, pressure, standardPressure, amount: total, entropy, enthalpy,
    gibbsEnergy: split(-temperature * idealEntropy, -temperature * pressureEntropy, enthalpy - temperature * realEntropy),
    potentials: chemicalPotentials(model, blend.value, fractions, standardPressure),
    sources: sources.map(({ key, amount, pressure: at, assumed }) => ({ parent: key, amount: mole(amount), pressure: at, assumed })),
  });
}

function split(ideal: number, pressure: number, realGas: number): MixingSplit {
  return { total: ideal + pressure + realGas, ideal, pressure, realGas };
}

function sourcesOf(job: Job, amounts: FillAmounts, blendPressure: Pascal): Source[] {
  const sources = job.parents.flatMap((parent, s): Source[] => {
    const amount = amounts.additions[s]!;
    if (!(amount > 0)) return [];
    return [{
      key: parent.key, amount, fractions: parent.fractions,
      pressure: parent.pressure ?? blendPressure, assumed: parent.pressure === null,
    }];
  });
  const held = amounts.residual.reduce((sum, amount) => sum + amount, 0);
  if (!(held > 0)) return sources;
  const { fractions, pressure } = job.cylinder.contents;
  return [{ key: null, amount: held, fractions, pressure, assumed: false }, ...sources];
}

/** Σ yᵢ ln(xᵢ/yᵢ) over what the source brings: zero when it has the blend's own composition. */
function sumXLogRatio(source: Float64Array, blend: Float64Array): number {
  return source.reduce((sum, y, i) => (y > 0 ? sum + y * Math.log(blend[i]! / y) : sum), 0);
}

function chemicalPotentials(
  model: ThermoModel, blend: ThermoState, fractions: Float64Array, standardPressure: Pascal,
): ChemicalPotential[] {
  const RT = model.gasConstant * blend.temperature;
  const pressure = RT * Math.log(blend.pressure / standardPressure);
  return [...fractions].flatMap((x, gas): ChemicalPotential[] => {
    if (!(x > 0)) return [];
    const idealMixing = RT * Math.log(x);
    const realGas = RT * blend.lnFugacityCoefficients[gas]!;
    return [{ gas, idealMixing, pressure, realGas, relative: idealMixing + pressure + realGas }];
  });
}
