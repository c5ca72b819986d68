import { fail, kelvin, molePerCubicMetre, ok, pascal } from '../units/index.ts';
import type { Outcome } from '../units/index.ts';
import { findGas, gasIds, modelName, phaseOf, realModel } from '../thermo/index.ts';
import type { GasId, Phase, ThermoModel, ThermoReason, ThermoState } from '../thermo/index.ts';
import type { CommandAnswer } from './run.ts';
import { readFlags } from './flags.ts';
import type { GasConstant } from './flags.ts';

/** Why one state of the array has no answer. */
type StateReason =
  | ThermoReason
  | { readonly code: 'state-not-an-object' }
  | { readonly code: 'field-unknown'; readonly field: string }
  | { readonly code: 'field-not-a-number'; readonly field: string }
  | { readonly code: 'pressure-or-density' };

interface StateRequest {
  readonly gases: readonly GasId[];
  readonly x: readonly number[];
  readonly temperature_K: number;
  readonly pressure_kPa: number | null;
  readonly density_mol_per_L: number | null;
}

const FIELDS = ['composition', 'temperature_K', 'pressure_kPa', 'density_mol_per_L'];

/** A JSON array of states → an array of properties, one answer each; only an unreadable file fails as a whole. */
export function propertiesCommand(input: string, flags: readonly string[]): CommandAnswer {
  const gasConstant = readFlags(flags);
  if (!gasConstant.ok) return { output: JSON.stringify({ ok: false, reason: gasConstant.reason }), exitCode: 2 };
  const states = parseArray(input);
  if (states === null) {
    return { output: JSON.stringify({ ok: false, reason: { code: 'not-a-json-array' } }), exitCode: 1 };
  }
  return { output: JSON.stringify(states.map((state) => answer(state, gasConstant.value)), null, 1), exitCode: 0 };
}

function parseArray(input: string): unknown[] | null {
  try {
    const value: unknown = JSON.parse(input);
    return Array.isArray(value) ? value : null;
  } catch (error) {
    if (error instanceof SyntaxError) return null;
    throw error;
  }
}

function answer(state: unknown, gasConstant: GasConstant): object {
  const request = readRequest(state);
  if (!request.ok) return { ok: false, reason: request.reason };
  const { gases, x } = request.value;
  const model = realModel(gases, { gasConstant });
  if (!model.ok) return { ok: false, reason: model.reason };
  const temperature = kelvin(request.value.temperature_K);
  const result = request.value.pressure_kPa === null
    ? model.value.state(temperature, molePerCubicMetre((request.value.density_mol_per_L ?? NaN) * 1e3), x)
    : model.value.stateAtPressure(temperature, pascal(request.value.pressure_kPa * 1e3), x);
  if (!result.ok) return { ok: false, reason: result.reason };
  const phase = phaseOfRoot(model.value, result.value, x);
  return { ok: true, phase, model: `${modelName(gases)}, ${model.value.modelClass(x).class}`, ...propertiesJson(gases, result.value) };
}

/** The phase of a state, which may have been asked for by a density that no gas has. */
function phaseOfRoot(model: ThermoModel, { temperature, pressure, density }: ThermoState, x: readonly number[]): Phase {
  const phase = phaseOf(model, temperature, pressure, x);
  const gas = model.density(temperature, pressure, x);
  return gas.ok && Math.abs(gas.value.density / density - 1) > 1e-6 ? 'not tested' : phase;
}

function propertiesJson(gases: readonly GasId[], state: ThermoState): object {
  return {
    range: state.range,
    molarMass_g_per_mol: state.molarMass * 1e3,
    density_mol_per_L: state.density / 1e3,
    pressure_kPa: state.pressure / 1e3,
    compressibilityFactor: state.compressibilityFactor,
    lnFugacityCoefficient: Object.fromEntries(gases.map((gas, i) => [gas, state.lnFugacityCoefficients[i]])),
    residualEntropy_J_per_molK: state.residualEntropy,
    residualEnthalpy_J_per_mol: state.residualEnthalpy,
    residualGibbsEnergy_J_per_mol: state.residualGibbsEnergy,
    isobaricHeatCapacity_J_per_molK: state.isobaricHeatCapacity,
    isochoricHeatCapacity_J_per_molK: state.isochoricHeatCapacity,
    speedOfSound_m_per_s: state.speedOfSound,
    jouleThomsonCoefficient_K_per_kPa: state.jouleThomsonCoefficient * 1e3,
  };
}

function readRequest(state: unknown): Outcome<StateRequest, StateReason> {
  if (!isRecord(state)) return fail({ code: 'state-not-an-object' });
  const unknown = Object.keys(state).find((key) => !FIELDS.includes(key));
  if (unknown !== undefined) return fail({ code: 'field-unknown', field: unknown });
  const { composition, temperature_K, pressure_kPa, density_mol_per_L } = state;
  if (!isRecord(composition)) return fail({ code: 'field-not-a-number', field: 'composition' });
  const parts: { readonly gas: GasId; readonly x: number }[] = [];
  for (const [name, value] of Object.entries(composition)) {
    const gas = findGas(name);
    if (gas === undefined) return fail({ code: 'unknown-gas', gas: name });
    if (typeof value !== 'number') return fail({ code: 'field-not-a-number', field: `composition.${name}` });
    parts.push({ gas, x: value });
  }
  // In one order, so that states of the same gases share one compiled model however their keys are written.
  parts.sort((a, b) => gasIds.indexOf(a.gas) - gasIds.indexOf(b.gas));
  if (typeof temperature_K !== 'number') return fail({ code: 'field-not-a-number', field: 'temperature_K' });
  if ((pressure_kPa === undefined) === (density_mol_per_L === undefined)) return fail({ code: 'pressure-or-density' });
  if (pressure_kPa !== undefined && typeof pressure_kPa !== 'number') return fail({ code: 'field-not-a-number', field: 'pressure_kPa' });
  if (density_mol_per_L !== undefined && typeof density_mol_per_L !== 'number') {
    return fail({ code: 'field-not-a-number', field: 'density_mol_per_L' });
  }
  return ok({ gases: parts.map(({ gas }) => gas), x: parts.map((part) => part.x), temperature_K, pressure_kPa: pressure_kPa ?? null, density_mol_per_L: density_mol_per_L ?? null });
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
