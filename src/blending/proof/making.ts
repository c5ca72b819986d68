/** Helpers with which the groups write down their cases. */
import { fail, kelvin, ok, pascal } from '../../units/index.ts';
import type { Outcome } from '../../units/index.ts';
import { gasEquation, gasIds, realModel } from '../../thermo/index.ts';
import type { GasId, RealModelOptions, ThermoModel, ThermoReason, ThermoState } from '../../thermo/index.ts';
import { gasLabel } from '../gases.ts';
import type { ProofTolerance } from './case.ts';

/** R as GERG-2008 was published with it, for everything that is held against its tables. */
export const asPublished: RealModelOptions = { gasConstant: 'gerg2008' };

export function relative(value: number): ProofTolerance {
  return { kind: 'relative', value };
}

export function absolute(value: number): ProofTolerance {
  return { kind: 'absolute', value };
}

/** Half a unit of the last printed decimal, with a little for the rounding of a value that ends in 5. */
export function printed(decimals: number): ProofTolerance {
  // Read from text, because powers of ten differ in their last bit between engines, and the digest would too.
  return absolute(Number(`0.5001e-${decimals}`));
}

/** A name of the data as a gas of this program; null when the program has no equation for it. */
export function gasOf(name: string): GasId | null {
  return gasIds.find((id) => id === name) ?? null;
}

/** Whether the program computes the gas with the long equation that the reference values come from too. */
export function hasOwnEquation(name: string): boolean {
  const gas = gasOf(name);
  return gas !== null && gasEquation(gas).kind === 'Helmholtz';
}

/** `CO₂`. */
export function formulaOf(name: string): string {
  const gas = gasOf(name);
  return gas === null ? name : gasLabel(gas).formula;
}

/** A model of gases named in the data, with the fractions beside them. */
export function modelOf(composition: Readonly<Record<string, number>>, options: RealModelOptions = {}): Outcome<{ model: ThermoModel; x: number[] }, ThermoReason> {
  const gases: GasId[] = [];
  for (const name of Object.keys(composition)) {
    const gas = gasOf(name);
    if (gas === null) return fail({ code: 'unknown-gas', gas: name });
    gases.push(gas);
  }
  const model = realModel(gases, options);
  return model.ok ? ok({ model: model.value, x: Object.values(composition) }) : model;
}

/** The state of a mixture at T and p (absolute), and what a case asks of it. */
export function atPressure<Value>(
  composition: Readonly<Record<string, number>>, temperature_K: number, pressure_kPa: number,
  value: (state: ThermoState, model: ThermoModel) => Value, options: RealModelOptions = {},
): Outcome<Value, ThermoReason> {
  const made = modelOf(composition, options);
  if (!made.ok) return made;
  const { model, x } = made.value;
  const state = model.stateAtPressure(kelvin(temperature_K), pascal(pressure_kPa * 1e3), x);
  return state.ok ? ok(value(state.value, model)) : state;
}

/** Computes something at most once and keeps it: several figures of one plan need one plan. */
export function once<Value>(make: () => Value): () => Value {
  let kept: { readonly value: Value } | null = null;
  return () => {
    kept ??= { value: make() };
    return kept.value;
  };
}

/** The figure that a case wants of an answer. */
export function figure<Value, Reason extends { readonly code: string }>(
  answer: Outcome<Value, Reason>, pick: (value: Value) => number | null | undefined,
): Outcome<number, Reason | { readonly code: 'figure-missing' }> {
  if (!answer.ok) return answer;
  const value = pick(answer.value);
  return value === null || value === undefined ? fail({ code: 'figure-missing' }) : ok(value);
}
