import { cubicMetre, kilogram, kilogramPerCubicMetre, kilogramPerMole } from '../../units/index.ts';
import type { Kelvin, Pascal } from '../../units/index.ts';
import { phaseOf } from '../../thermo/index.ts';
import type { ModelSource, ThermoModel } from '../../thermo/index.ts';
import type { Job } from '../recipe/job.ts';
import type { Vessel } from '../steps/cylinder.ts';
import { unitDensity } from '../steps/unit-density.ts';
import { massOf, pressuresAt } from './fill-states.ts';
import type { CylinderState, FinalQuantities, PlannedComponent } from './plan.ts';

/** Temperatures at which regulations and standards look at a filled cylinder, °C. */
export const DEVELOPED_CELSIUS: readonly number[] = [15, 20, 21.1, 55, 65];

/** Density of water at 15 °C and 1 atm, kg/m³ (CIPM 2001 water density formula: 999.103). */
export const WATER_DENSITY_15C = kilogramPerCubicMetre(999.103);

/**
 * A pure component that is no gas at the concentration state has no volume there. Below
 * this fraction it is counted as an ideal gas in the sum, which moves the other volume
 * fractions by less than its own fraction; above it none is stated.
 */
const NEGLIGIBLE = 1e-4;

/** Amount that traces are reported above, mol/mol: what is below cannot matter to any limit used here. */
const REPORTED_ABOVE = 1e-15;

/**
 * What the finished cylinder holds in every quantity a certificate or a label
 * may ask for. `byIdealStops` is aligned with `Job.gases`, or null.
 */
export function finalQuantities(
  job: Job, model: ThermoModel, models: ModelSource, vessel: Vessel, finished: CylinderState,
  molarMasses: Float64Array, byIdealStops: Float64Array | null,
): FinalQuantities {
  const meanMolarMass = massOf(finished.fractions, molarMasses);
  const totalMass = meanMolarMass * finished.total;
  const { roomTemperature, barometer } = job.conditions;
  return {
    components: components(job, model, models, finished, molarMasses, byIdealStops),
    meanMolarMass: kilogramPerMole(meanMolarMass),
    totalMass: kilogram(totalMass),
    fillingRatio: totalMass / (WATER_DENSITY_15C * job.cylinder.waterCapacity),
    massDensity: kilogramPerCubicMetre(meanMolarMass * finished.density),
    developedPressures: pressuresAt(model, vessel, finished.amounts, DEVELOPED_CELSIUS),
    // At barometric pressure every gas here is within a few tenths of a percent of ideal: ample for a room estimate.
    releasedVolume: cubicMetre((finished.total * model.gasConstant * roomTemperature) / barometer),
  };
}

function components(
  job: Job, model: ThermoModel, models: ModelSource, finished: CylinderState,
  molarMasses: Float64Array, byIdealStops: Float64Array | null,
): PlannedComponent[] {
  const { concentrationTemperature: temperature, concentrationPressure: pressure } = job.conditions;
  const x = finished.fractions;
  const mean = massOf(x, molarMasses);
  const density = gasDensity(model, temperature, pressure, x);
  const volumes = pureVolumes(job, model, models, x, temperature, pressure);
  const nominal = new Map(job.order.components.map((component) => [component.gas, component.nominal]));
  return job.gases.flatMap((gas, i): PlannedComponent[] => {
    if (!nominal.has(i) && x[i]! <= REPORTED_ABOVE) return [];
    return [{
      gas,
      nominal: nominal.get(i) ?? null,
      planned: x[i]!,
      byIdealStops: byIdealStops?.[i] ?? null,
      massFraction: (x[i]! * molarMasses[i]!) / mean,
      volumeFraction: volumes === null || volumes.own[i] === null ? null : volumes.own[i]! / volumes.total,
      massConcentration: density === null ? null : x[i]! * density * molarMasses[i]!,
      partialPressure: x[i]! * finished.pressure,
    }];
  });
}

interface PureVolumes {
  /** m³ per mole of mixture, aligned with `Job.gases`; null for a gas that is absent or no gas at the state. */
  readonly own: readonly (number | null)[];
  readonly total: number;
}

/** Volume each pure gas would take at the concentration state; null when one that matters is no gas there. */
function pureVolumes(
  job: Job, model: ThermoModel, models: ModelSource, x: Float64Array, temperature: Kelvin, pressure: Pascal,
): PureVolumes | null {
  const own: (number | null)[] = [];
  let total = 0;
  for (const [i, gas] of job.gases.entries()) {
    const fraction = x[i]!;
    const pure = fraction > REPORTED_ABOVE ? models([gas]) : null;
    const density = pure?.ok === true ? gasDensity(pure.value, temperature, pressure, [1]) : null;
    if (density === null && fraction > NEGLIGIBLE) return null;
    own.push(density === null ? null : fraction / density);
    total += density === null ? (fraction * model.gasConstant * temperature) / pressure : fraction / density;
  }
  return { own, total };
}

/** Amount density where the state is known to be gas, mol/m³; null elsewhere. */
function gasDensity(model: ThermoModel, temperature: Kelvin, pressure: Pascal, x: ArrayLike<number>): number | null {
  const phase = phaseOf(model, temperature, pressure, x);
  if (phase !== 'gas' && phase !== 'supercritical') return null;
  const density = unitDensity(model, temperature, pressure, Float64Array.from(x));
  return density.ok ? density.value : null;
}
