import {
  celsius, formatAmountFraction, formatMass, formatNumber, formatPressureInFull, formatSignificant, formatTemperature, fraction, pascal,
} from '../../units/index.ts';
import type { Kelvin, Pascal } from '../../units/index.ts';
import { gasEquation, gasRecord } from '../../thermo/index.ts';
import { gasLabel } from '../gases.ts';
import type { Job, JobGauge } from '../recipe/job.ts';
import type { CylinderState, Plan, PlannedComponent, PlanStep } from '../plan/plan.ts';
import { airDensity, WEIGHT_DENSITY } from '../steps/weighing.ts';
import type { Working, WorkingLine } from './working.ts';

const MODEL_SOURCE = 'GERG-2008: O. Kunz, W. Wagner, J. Chem. Eng. Data 57 (2012) 3032; ISO 20765-2';

/** Working of a stop: p V(p, T) = N Z R T, then the gauge. */
export function explainStop(plan: Plan, step: PlanStep): Working {
  const gauge = gaugeOf(plan.job, step);
  return {
    title: `Stop of step ${String(step.number)}`,
    formula: 'p = N Z(x, p, T) R T / V(p, T);  V = V₀ [1 + 3α(T − T₀) + κ(p − p_atm)];  gauge stop = p − p_atm',
    lines: [
      ...stateLines(plan, step.state),
      { symbol: 'V₀', meaning: 'water capacity', value: `${formatSignificant(plan.job.cylinder.waterCapacity * 1000, 6)} L` },
      { symbol: 'κ', meaning: 'volume growth by overpressure', value: `${formatSignificant(plan.job.cylinder.pressureExpansion * 1e5, 3)} /bar` },
      { symbol: 'α', meaning: 'linear growth by temperature', value: `${formatSignificant(plan.job.cylinder.thermalExpansion, 3)} /K` },
      { symbol: 'V', meaning: 'volume at this stop', value: `${formatSignificant(step.state.volume * 1000, 6)} L` },
      { symbol: 'p_atm', meaning: 'barometer', value: absolute(plan.job.conditions.barometer, plan.job) },
    ],
    result: `${absolute(step.state.pressure, plan.job)} = ${shown(step.state.pressure, plan.job, gauge)}`,
    source: `${modelSource(plan.job)}; cylinder growth: thin-wall formula, editable`,
  };
}

/** Working of a mass: amount times mean molar mass of the parent, and the balance with buoyancy. */
export function explainMass(plan: Plan, step: PlanStep): Working {
  const { conditions } = plan.job;
  const air = airDensity(conditions.roomTemperature, conditions.barometer, conditions.relativeHumidity);
  return {
    title: `Mass of step ${String(step.number)}`,
    formula: 'm = n M;  gain = (m − ρₐ ΔV) / (1 − ρₐ / 8000 kg/m³)',
    lines: [
      { symbol: 'n', meaning: 'amount added', value: `${formatSignificant(step.amount, 7)} mol` },
      { symbol: 'M', meaning: 'mean molar mass of the parent', value: `${formatSignificant((step.mass / step.amount) * 1000, 7)} g/mol` },
      { symbol: 'm', meaning: 'mass added', value: formatMass(step.mass, 1e-6) },
      { symbol: 'ρₐ', meaning: 'density of the room air', value: `${formatSignificant(air, 5)} kg/m³` },
      { symbol: 'ΔV', meaning: 'growth of the cylinder, all steps so far', value: `${formatSignificant(growth(plan, step), 3)} mL` },
      { symbol: '8000', meaning: 'density of the weights', value: `${String(WEIGHT_DENSITY)} kg/m³` },
    ],
    result: `gain ${formatMass(step.weighing.readingGain, 1e-6)} in this step, ${formatMass(step.weighing.cumulativeGain, 1e-6)} since the start`,
    source: 'Molar masses: IUPAC/CIAAW standard atomic weights; buoyancy: conventional mass, OIML R 111 (from memory)',
  };
}

/** Working of the ideal-gas figure beside a stop. */
export function explainIdealStop(plan: Plan, step: PlanStep): Working {
  const gauge = gaugeOf(plan.job, step);
  return {
    title: `Ideal-gas arithmetic for step ${String(step.number)}`,
    formula: 'p_k = p_(k−1) + (n_s / N) p_fill, at one temperature (Dalton), cylinder rigid',
    lines: [
      { symbol: 'p_fill', meaning: 'fill pressure', value: absolute(plan.job.order.fillPressure, plan.job) },
      { symbol: 'p', meaning: 'real stop', value: absolute(step.state.pressure, plan.job) },
    ],
    result: step.idealStop === null ? 'the ideal-gas law has no plan for this order' : shown(step.idealStop, plan.job, gauge),
    source: 'Dalton’s law; shown for comparison only',
  };
}

/** Working of one component's fraction, its mass and volume fraction and its concentration. */
export function explainComponent(plan: Plan, component: PlannedComponent): Working {
  const { conditions } = plan.job;
  const index = plan.job.gases.indexOf(component.gas);
  const record = gasRecord(component.gas);
  const state = `${formatTemperature(conditions.concentrationTemperature)}, ${absolute(conditions.concentrationPressure, plan.job)}`;
  return {
    title: `${gasLabel(component.gas).formula} in the finished gas`,
    formula: 'xᵢ = nᵢ / N;  wᵢ = xᵢMᵢ / Σ xM;  φᵢ = xᵢZᵢ / Σ xZ;  βᵢ = xᵢ p Mᵢ / (Z R T);  pᵢ = xᵢ p',
    lines: [
      { symbol: 'nᵢ', meaning: 'amount', value: `${formatSignificant(plan.finished.amounts[index]!, 7)} mol` },
      { symbol: 'N', meaning: 'total amount', value: `${formatSignificant(plan.finished.total, 7)} mol` },
      { symbol: 'Mᵢ', meaning: 'molar mass', value: `${formatSignificant(record.molarMass.value * 1000, 7)} g/mol` },
      { symbol: 'wᵢ', meaning: 'mass fraction', value: formatSignificant(component.massFraction, 6) },
      { symbol: 'φᵢ', meaning: `volume fraction at ${state}`, value: numberOrReason(component.volumeFraction, (value) => formatSignificant(value, 6)) },
      { symbol: 'βᵢ', meaning: `mass concentration at ${state}`, value: numberOrReason(component.massConcentration, (value) => `${formatSignificant(value * 1e6, 6)} mg/m³`) },
      { symbol: 'pᵢ', meaning: 'partial pressure in the cylinder', value: absolute(pascal(component.partialPressure), plan.job) },
    ],
    result: amountText(component.planned, 7),
    source: 'Definitions of ISO 14912 (from memory); molar masses IUPAC/CIAAW',
  };
}

/** Working of a developed pressure of the closed cylinder. */
export function explainDeveloped(plan: Plan, pressure: Pascal, temperature: Kelvin): Working {
  return {
    title: `Pressure at ${formatNumber(celsius(temperature), 1)} °C`,
    formula: 'p V(p, T) = N Z(x, p, T) R T with N as filled',
    lines: stateLines(plan, plan.finished).slice(0, 2),
    result: absolute(pressure, plan.job),
    source: modelSource(plan.job),
  };
}

/** The model, and the equation of each gas that is not one of GERG-2008's own. */
function modelSource(job: Job): string {
  const others = job.gases.flatMap((gas) => {
    const { kind, source } = gasEquation(gas);
    return kind === 'GERG-2008' ? [] : [`${gasLabel(gas).formula}: ${source}`];
  });
  return [MODEL_SOURCE, ...others].join('; ');
}

function stateLines(plan: Plan, state: CylinderState): WorkingLine[] {
  return [
    { symbol: 'N', meaning: 'amount in the cylinder', value: `${formatSignificant(state.total, 7)} mol` },
    { symbol: 'x', meaning: 'composition', value: composition(plan.job, state.fractions) },
    { symbol: 'T', meaning: 'gas temperature', value: `${formatSignificant(state.temperature, 6)} K` },
    { symbol: 'Z', meaning: 'compressibility factor', value: formatNumber(state.compressibilityFactor, 5) },
    { symbol: 'R', meaning: 'gas constant', value: `${String(plan.gasConstant)} J/(mol K)` },
  ];
}

function composition(job: Job, fractions: Float64Array): string {
  return job.gases
    .flatMap((gas, i) => (fractions[i]! >= 1e-7 ? [`${gasLabel(gas).formula} ${amountText(fractions[i]!, 4)}`] : []))
    .join(', ');
}

function growth(plan: Plan, step: PlanStep): number {
  return (step.state.volume - (plan.start?.volume ?? plan.job.cylinder.waterCapacity)) * 1e6;
}

function amountText(x: number, digits: number): string {
  const { number, unit } = formatAmountFraction(fraction(x), digits);
  return `${number} ${unit}`;
}

function numberOrReason(value: number | null, format: (value: number) => string): string {
  return value === null ? 'not stated: not known to be a gas at that state' : format(value);
}

function absolute(pressure: Pascal, job: Job): string {
  return formatPressureInFull(pressure, { unit: 'bar', reference: 'absolute', barometer: job.conditions.barometer, resolution: 10 });
}

function gaugeOf(job: Job, step: PlanStep): JobGauge | null {
  return job.gauges.find((gauge) => gauge.key === step.gauge) ?? null;
}

function shown(pressure: Pascal, job: Job, gauge: JobGauge | null): string {
  return formatPressureInFull(pressure, {
    unit: gauge?.unit ?? 'bar', reference: gauge?.reference ?? 'gauge',
    barometer: job.conditions.barometer, resolution: gauge?.resolution ?? 1000,
  });
}
