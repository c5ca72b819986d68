import { describe, expect, it } from 'vitest';
import { mixingSentence, recipeSentence, thermoSentence } from '../../../src/blending/index.ts';
import type { RecipeProblem } from '../../../src/blending/index.ts';
import type { ThermoReason } from '../../../src/thermo/index.ts';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { expectSentence } from './sentences.ts';

const field = 'order';
const barometer = pascal(101325);
const nearest = { components: [
  { gas: 'carbon dioxide', nominal: 0.05, fraction: 0.02 }, { gas: 'nitrogen', nominal: 0.95, fraction: 0.98 }, { gas: 'argon', nominal: null, fraction: 1e-9 },
] } as const;

/** One reason of every code; a new code without an example does not compile. */
const thermoReasons: { readonly [Code in ThermoReason['code']]: Extract<ThermoReason, { code: Code }> } = {
  'unknown-gas': { code: 'unknown-gas', gas: 'phlogiston' },
  'no-gases': { code: 'no-gases' },
  'duplicate-gas': { code: 'duplicate-gas', gas: 'argon' },
  'composition-length': { code: 'composition-length', expected: 2, given: 3 },
  'fraction-invalid': { code: 'fraction-invalid', gas: 'argon', value: -1 },
  'fractions-do-not-sum': { code: 'fractions-do-not-sum', sum: 0.9 },
  'temperature-invalid': { code: 'temperature-invalid', value: NaN },
  'pressure-invalid': { code: 'pressure-invalid', value: -1 },
  'density-invalid': { code: 'density-invalid', value: 0 },
  'no-gas-root': { code: 'no-gas-root', temperature: 293.15, pressure: 60e5 },
  'no-liquid-root': { code: 'no-liquid-root', temperature: 293.15, pressure: 60e5 },
  'not-converged': { code: 'not-converged', iterations: 60, residual: 1e-3 },
  'equations-not-loaded': { code: 'equations-not-loaded', gases: ['neon', 'ethylene'] },
  'not-compared': { code: 'not-compared' },
  'equation-breaks-down': { code: 'equation-breaks-down', temperature: 293.15, density: 3e4 },
};

const problems: { readonly [Code in RecipeProblem['code']]: Extract<RecipeProblem, { code: Code }> } = {
  'entry': { code: 'entry', field, problem: { code: 'not-a-number', text: 'much' } },
  'gas-unknown': { code: 'gas-unknown', field, text: 'phlogiston' },
  'gas-missing': { code: 'gas-missing', field },
  'gas-repeated': { code: 'gas-repeated', field, gas: 'carbon dioxide' },
  'no-components': { code: 'no-components', field },
  'two-balances': { code: 'two-balances', field },
  'sum-not-one': { code: 'sum-not-one', field, sum: 0.97 },
  'sum-above-one': { code: 'sum-above-one', field, sum: 1.02 },
  'fraction-zero': { code: 'fraction-zero', field },
  'limit-in-order': { code: 'limit-in-order', field },
  'not-positive': { code: 'not-positive', field },
  'barometer-unlikely': { code: 'barometer-unlikely', field, lowest: pascal(5e4), highest: pascal(1.1e5) },
  'room-unlikely': { code: 'room-unlikely', field, lowest: kelvin(233.15), highest: kelvin(333.15) },
  'no-parents': { code: 'no-parents', field },
  'origin-missing': { code: 'origin-missing', field },
  'number-alone': { code: 'number-alone', field, text: '4.4 %' },
  'value-beyond': { code: 'value-beyond', field, lowest: 1e-9, highest: 1e9 },
  'not-a-day': { code: 'not-a-day', field },
  'not-a-count': { code: 'not-a-count', field, text: 'two', most: 100 },
  'share-outside': { code: 'share-outside', field },
  'purge-not-above': { code: 'purge-not-above', field },
  'purge-without-parent': { code: 'purge-without-parent', field },
  'purge-without-end': { code: 'purge-without-end', field },
  'purge-never-ends': { code: 'purge-never-ends', field, cycles: 100, oldGas: 0.31 },
  'key-repeated': { code: 'key-repeated', field, key: 'p1' },
  'component-without-parent': { code: 'component-without-parent', field, gases: ['helium'], nearest },
  'cannot-be-made': { code: 'cannot-be-made', field, gases: ['carbon dioxide', 'carbon monoxide'], nearest },
  'residual-in-the-way': { code: 'residual-in-the-way', field, gases: ['argon'], ventTo: pascal(5.2004e5), barometer },
  'fill-pressure-too-low': { code: 'fill-pressure-too-low', field, residualPressure: pascal(12e5), barometer },
  'no-state': { code: 'no-state', field, where: 'step 2', reason: thermoReasons['no-gas-root'] },
};

describe('recipeSentence', () => {
  it.each(Object.entries(problems))('%s', (_code, problem) => expectSentence(recipeSentence(problem)));

  it('names gases by formula and the nearest composition without traces', () => {
    expect(recipeSentence(problems['cannot-be-made'])).toMatch(/CO₂, CO cannot be met.*nearest that can be made is 2\.000 % CO₂, 98\.00 % N₂\.$/);
  });

  it('says how far to vent, rounded to the low side', () => {
    expect(recipeSentence(problems['residual-in-the-way'])).toContain('Vent it to 4.18 bar gauge or less');
    expect(recipeSentence({ ...problems['residual-in-the-way'], ventTo: pascal(52_034) })).toContain('Evacuate it to 0.520 bar absolute or less');
    expect(recipeSentence({ ...problems['residual-in-the-way'], ventTo: null })).toContain('Evacuate the cylinder first.');
  });
});

describe('thermoSentence and mixingSentence', () => {
  it.each(Object.entries(thermoReasons))('%s', (_code, reason) => {
    expectSentence(thermoSentence(reason));
    expectSentence(mixingSentence({ code: 'mixing-state', source: 'p1', reason }, () => 'CO₂ 4.8'));
  });

  it('name the source', () => {
    expect(mixingSentence({ code: 'mixing-state', source: 'p1', reason: thermoReasons['no-gas-root'] }, (key) => `parent ${key}`)).toContain('parent p1');
  });
});
