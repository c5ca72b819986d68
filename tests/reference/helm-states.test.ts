/**
 * States of gases outside GERG-2008, computed with CoolProp 8.0.1dev. Pure gases are
 * the same equation there and here. Every mixture of the list holds a gas of GERG-2008,
 * whose short equation stands here and whose long one there.
 */
import { describe, expect, it } from 'vitest';
import { realModelWithPairs } from '../../src/thermo/model/real-model.ts';
import type { PublishedPair } from '../../src/thermo/model/pairs.ts';
import type { GasId, ThermoState } from '../../src/thermo/index.ts';
import { kelvin, molePerCubicMetre, pascal } from '../../src/units/index.ts';
import { states } from '../fixtures/helm-states.json';
import { noblePairs } from '../fixtures/noble-pairs.ts';
import { given, modelOf } from '../thermo/given.ts';

type Known = (typeof states)[number];

/**
 * The state, the model's R in the place of theirs. Pairs of two GERG gases keep
 * their published row; the others take the record's numbers.
 */
function stateOf(known: Known): { readonly state: ThermoState; readonly gases: readonly GasId[]; readonly perR: number } {
  const gases = Object.keys(known.composition) as GasId[];
  const x = Object.values(known.composition);
  const model = 'pairs' in known ? given(realModelWithPairs(gases, known.pairs.map(pairOf))) : modelOf(gases);
  const perR = known.gasConstant_J_per_molK / model.gasConstant;
  return { state: given(model.stateAtPressure(kelvin(known.temperature_K), pascal(known.pressure_kPa * 1e3 / perR), x)), gases, perR };
}

function pairOf(row: (string | number)[]): PublishedPair {
  const [first, second, betaV, gammaV, betaT, gammaT] = row as [GasId, GasId, number, number, number, number];
  const noble = noblePairs.find((pair) => pair.row.includes(first) && pair.row.includes(second));
  return noble ?? { row: [first, second, betaV, gammaV, betaT, gammaT, 'mean'] };
}

const pure = states.filter((known) => !('pairs' in known));
const mixed = states.filter((known) => 'pairs' in known);

describe('published: pure gases (CoolProp), to 1e-9', () => {
  it.each(pure.map((known) => [known.name, known] as const))('%s', (_, known) => {
    const { state, gases: [gas], perR } = stateOf(known);
    const relative = (value: number, published: number) => { expect(Math.abs(value / published - 1)).toBeLessThan(1e-9); };
    relative(state.density, known.density_mol_per_L * 1e3);
    relative(state.residualEntropy * perR, known.residualEntropy_J_per_molK);
    relative(state.residualEnthalpy * perR, known.residualEnthalpy_J_per_mol);
    relative(state.residualGibbsEnergy * perR, known.residualGibbsEnergy_J_per_mol);
    relative(state.lnFugacityCoefficients[0]!, (known.lnFugacityCoefficients as Record<string, number>)[gas!]!);
    relative(state.isobaricHeatCapacity * perR, known.isobaricHeatCapacity_J_per_molK!);
    relative(state.speedOfSound * Math.sqrt(perR), known.speedOfSound_m_per_s!);
    relative(state.jouleThomsonCoefficient * 1e3 / perR, known.jouleThomson_K_per_kPa!);
  });

  it.each(pure.map((known) => [known.name, known] as const))('%s: second virial coefficient', (_, known) => {
    const [gas] = Object.keys(known.composition) as GasId[];
    const found = given(modelOf([gas!]).secondVirialCoefficient(kelvin(known.temperature_K), [1]));
    expect(Math.abs(found * 1e6 / known.secondVirial_cm3_per_mol - 1)).toBeLessThan(1e-7);
  });
});

/**
 * Where density differs by more than 2e-3 from the record, and why: the pair of
 * CO2 and argon has another departure function there (Gernert 2013).
 */
const explained: Readonly<Record<string, number>> = { 'GERG fluids as HEOS: 20% CO2 in Ar': 5e-3 };

describe('published: mixtures with gases of GERG-2008 (CoolProp), density within 2e-3', () => {
  it.each(mixed.filter(({ name }) => !name.startsWith('GERG fluids')).map((known) => [known.name, known.temperature_K, known] as const))('%s, %s K', (_, _T, known) => {
    const { state, gases, perR } = stateOf(known);
    expect(Math.abs(state.density / (known.density_mol_per_L * 1e3) - 1)).toBeLessThan(2e-3);
    expect(Math.abs(state.residualGibbsEnergy * perR - known.residualGibbsEnergy_J_per_mol)).toBeLessThan(25);
    for (const [i, gas] of gases.entries()) {
      expect(Math.abs(state.lnFugacityCoefficients[i]! - (known.lnFugacityCoefficients as Record<string, number>)[gas]!)).toBeLessThan(2e-2);
    }
  });

  it.each(mixed.filter(({ name }) => name.startsWith('GERG fluids')).map((known) => [known.name, known.temperature_K, known] as const))('%s, %s K: GERG-2008 as it is', (_, _T, known) => {
    const gases = Object.keys(known.composition) as GasId[];
    const state = given(modelOf(gases).stateAtPressure(kelvin(known.temperature_K), pascal(known.pressure_kPa * 1e3), Object.values(known.composition)));
    expect(Math.abs(state.density / (known.density_mol_per_L * 1e3) - 1)).toBeLessThan(explained[known.name] ?? 2e-3);
  });
});

describe('published: Tkaczuk et al. 2020, Table 8, equimolar at 200 K and 10 mol/L', () => {
  // The published models stand on the long equations of helium and argon: 0.02 to 0.04 % are expected.
  it.each([['helium', 'neon', 18_430_775.292601], ['neon', 'argon', 15_905_875.375781]] as const)('%s and %s', (first, second, published) => {
    const model = given(realModelWithPairs([first, second], noblePairs));
    const found = given(model.pressure(kelvin(200), molePerCubicMetre(1e4), [0.5, 0.5]));
    expect(Math.abs(found / published - 1)).toBeLessThan(5e-4);
  });
});
