import { emptyRecipe } from '../defaults.ts';
import type { OrderLine, Recipe } from '../document.ts';
import {
  benchConditions, benchCylinder, benchGauges, carbonDioxide48, carbonMonoxidePremix, methane45, nitrogen50, oxygen50, rackParent,
} from './laboratory.ts';

function ordered(gas: string, amount: string, tolerance = ''): OrderLine {
  return { gas, amount, tolerance };
}

const gauge = (typed: string) => ({ typed, reference: 'gauge' }) as const;

const bench: Recipe = { ...emptyRecipe, gauges: benchGauges, conditions: benchConditions };

/** Four components, a premix, oxygen, a residual pressure and both ways of filling: opens at the first start. */
const ambientSpan: Recipe = {
  ...bench,
  name: 'Ambient span gas, 4 components',
  note: 'Quay Street Laboratory, station 3',
  order: {
    components: [ordered('CO', '50 µmol/mol', '5 %'), ordered('CO₂', '5 %', '2 %'), ordered('O₂', '10 %', '2 %'), ordered('N₂', 'balance')],
    fillPressure: gauge('150 bar'),
    fillTemperature: '20 °C',
  },
  cylinder: benchCylinder('B-0417', {
    contents: {
      state: 'residual', pressure: { typed: '1 mbar', reference: 'absolute' }, temperature: '20 °C',
      composition: [{ gas: 'N₂', amount: '100 %' }],
    },
  }),
  parents: [carbonMonoxidePremix, carbonDioxide48, oxygen50, nitrogen50],
  route: { ...bench.route, by: 'pressure and mass' },
};

const carbonDioxideBlend: Recipe = {
  ...bench,
  name: 'CO₂ 5 % in nitrogen',
  note: 'Stack analyser span',
  order: {
    components: [ordered('CO₂', '5 %', '1 %'), ordered('N₂', 'balance')],
    fillPressure: { typed: '150 bar', reference: 'absolute' },
    fillTemperature: '20 °C',
  },
  cylinder: benchCylinder('B-0422'),
  parents: [carbonDioxide48, nitrogen50],
};

const premixDilution: Recipe = {
  ...bench,
  name: 'CO 25 µmol/mol from premix',
  note: 'Low-range check gas',
  order: {
    components: [ordered('CO', '25 µmol/mol', '5 %'), ordered('N₂', 'balance')],
    fillPressure: gauge('140 bar'),
    fillTemperature: '21 °C',
  },
  cylinder: benchCylinder('B-0398', { workingPressure: gauge('150 bar'), testPressure: gauge('225 bar'), startReading: '12.4310 kg' }),
  parents: [carbonMonoxidePremix, nitrogen50],
  route: { ...bench.route, by: 'pressure and mass' },
};

const naturalGas: Recipe = {
  ...bench,
  name: 'Pipeline gas, 6 components',
  note: 'Gas chromatograph check, winter delivery',
  order: {
    components: [
      ordered('n-C₄H₁₀', '0.3 %', '2 %'), ordered('C₃H₈', '1 %', '2 %'), ordered('CO₂', '1.8 %', '2 %'),
      ordered('N₂', '2.5 %', '2 %'), ordered('C₂H₆', '6 %', '2 %'), ordered('CH₄', 'balance'),
    ],
    fillPressure: gauge('60 bar'),
    fillTemperature: '20 °C',
  },
  cylinder: benchCylinder('S-1106', { material: 'steel', workingPressure: gauge('200 bar'), testPressure: gauge('300 bar') }),
  parents: [
    rackParent('butane', 'n-C₄H₁₀ 3.5', '1 bar', [{ gas: 'n-C₄H₁₀', amount: 'balance' }, { gas: 'i-C₄H₁₀', amount: '< 200 µmol/mol' }]),
    rackParent('propane', 'C₃H₈ 3.5', '7 bar', [{ gas: 'C₃H₈', amount: 'balance' }, { gas: 'C₂H₆', amount: '< 100 µmol/mol' }]),
    carbonDioxide48,
    nitrogen50,
    rackParent('ethane', 'C₂H₆ 4.5', '33 bar', [{ gas: 'C₂H₆', amount: 'balance' }, { gas: 'CH₄', amount: '< 20 µmol/mol' }]),
    methane45,
  ],
  route: { ...bench.route, by: 'pressure and mass' },
};

const oxygenEnriched: Recipe = {
  ...bench,
  name: 'Oxygen 40 % in nitrogen',
  note: 'Oxygen-clean cylinder; psi gauge on the oxygen bench',
  order: {
    components: [ordered('O₂', '40 %', '1 %'), ordered('N₂', 'balance')],
    fillPressure: gauge('2000 psi'),
    fillTemperature: '70 °F',
  },
  cylinder: benchCylinder('OX-012', {
    waterCapacity: '29.5 L', workingPressure: gauge('2216 psi'), workingPressureTemperature: '21.1 °C', testPressure: gauge('3693 psi'),
  }),
  parents: [oxygen50, nitrogen50],
  gauges: [{ key: 'g1', name: 'P1', unit: 'psi', reference: 'gauge', fullScale: '3000 psi', accuracy: '0.1 %', accuracyOf: 'span', resolution: '1 psi', calibrated: '2026-09-14' }],
};

/** Fuel and oxidiser in one cylinder: nitrogen has to come between them. */
const methaneWithOxygen: Recipe = {
  ...bench,
  name: 'CH₄ 1 % and O₂ 5 % in nitrogen',
  note: 'Order of addition chosen by the checks',
  order: {
    components: [ordered('CH₄', '1 %', '2 %'), ordered('O₂', '5 %', '2 %'), ordered('N₂', 'balance')],
    fillPressure: gauge('140 bar'), fillTemperature: '20 °C',
  },
  cylinder: benchCylinder('B-0433'),
  parents: [methane45, oxygen50, nitrogen50],
  route: { ...bench.route, sequence: 'best' },
};

/** Saved on the first start; the first one opens. */
export const demoRecipes: readonly Recipe[] = [ambientSpan, carbonDioxideBlend, premixDilution, naturalGas, oxygenEnriched, methaneWithOxygen];
