import { describe, expect, it } from 'vitest';
import { DEVELOPED_CELSIUS, WATER_DENSITY_15C } from '../../../src/blending/plan/final.ts';
import { GAS_CONSTANT } from '../../../src/thermo/index.ts';
import { planned, pure, residual } from '../lab.ts';

const plan = planned({
  order: [['CO', '50 µmol/mol'], ['CO2', '5 %'], ['N2', 'balance']], to: '150 bar',
  parents: [{ key: 'a', lines: [['CO', '1 %'], ['N2', 'balance'], ['O2', '< 30 µmol/mol']] }, pure('CO2'), pure('N2')],
});
const { components } = plan.final;
const sum = (values: readonly (number | null)[]): number => values.reduce<number>((total, value) => total + (value ?? NaN), 0);

describe('finalQuantities', () => {
  it('fractions of every kind add up to one', () => {
    expect(sum(components.map(({ planned: x }) => x))).toBeCloseTo(1, 12);
    expect(sum(components.map(({ massFraction }) => massFraction))).toBeCloseTo(1, 12);
    expect(sum(components.map(({ volumeFraction }) => volumeFraction))).toBeCloseTo(1, 12);
    expect(sum(components.map(({ partialPressure }) => partialPressure)) / plan.finished.pressure).toBeCloseTo(1, 12);
  });

  it('lists an impurity that nobody ordered, without a nominal amount', () => {
    expect(components.map(({ gas, nominal }) => [gas, nominal])).toEqual([
      ['carbon monoxide', 50e-6], ['carbon dioxide', 0.05], ['nitrogen', expect.closeTo(0.94995, 12)], ['oxygen', null],
    ]);
    // 15 µmol/mol of oxygen in the 0.5 % of premix.
    expect(components[3]!.planned * 1e9).toBeCloseTo(75, 1);
  });

  it('volume fraction: CO₂ takes less room than nitrogen at 20 °C, by Z 0.99466 / 0.99976 (computed)', () => {
    const [, carbonDioxide, nitrogen] = components;
    const ratio = (carbonDioxide!.volumeFraction! / carbonDioxide!.planned) / (nitrogen!.volumeFraction! / nitrogen!.planned);
    expect(ratio).toBeCloseTo(0.99466 / 0.99976, 4);
  });

  it('masses agree: mean molar mass, steps, density, filling ratio', () => {
    const { finished, final, steps, job } = plan;
    expect(final.totalMass / sum(steps.map(({ mass }) => mass))).toBeCloseTo(1, 12);
    expect(final.totalMass / (final.meanMolarMass * finished.total)).toBeCloseTo(1, 14);
    expect(final.massDensity * finished.volume).toBeCloseTo(final.totalMass, 12);
    // Published: water at 15 °C 999.10 kg/m³ (CIPM 2001).
    expect(WATER_DENSITY_15C).toBeCloseTo(999.1, 2);
    expect(final.fillingRatio).toBeCloseTo(final.totalMass / (999.103 * job.cylinder.waterCapacity), 12);
  });

  it('the mass of a residual counts as contents, not as an addition', () => {
    const left = planned({ order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar', contents: residual('2 bar', [['N2', '100 %']]) });
    expect(left.final.totalMass - sum(left.steps.map(({ mass }) => mass))).toBeCloseTo(left.start!.total * 0.02801371, 10);
  });

  it('developed pressures at 15, 20, 21.1, 55 and 65 °C, the fill pressure among them', () => {
    const developed = plan.final.developedPressures;
    expect(DEVELOPED_CELSIUS).toEqual([15, 20, 21.1, 55, 65]);
    expect(developed.map(({ temperature }) => temperature)).toEqual(DEVELOPED_CELSIUS.map((celsius) => 273.15 + celsius));
    expect(developed[1]!.pressure / 150e5).toBeCloseTo(1, 12);
    developed.slice(1).forEach(({ pressure }, k) => expect(pressure).toBeGreaterThan(developed[k]!.pressure));
  });

  it('released volume by the ideal-gas law at the barometer', () => {
    const { finished, final } = plan;
    expect(final.releasedVolume).toBeCloseTo((finished.total * GAS_CONSTANT * 293.15) / 101325, 10);
  });

  it('no volume fraction where a pure gas is not known to be a gas, no concentration where the blend is not', () => {
    const humid = planned({ order: [['H2O', '0.1 %'], ['N2', 'balance']], to: '10 bar', parents: [{ key: 'wet', lines: [['H2O', '0.1 %'], ['N2', 'balance']] }] });
    expect(humid.final.components.map(({ volumeFraction }) => volumeFraction)).toEqual([null, null]);
    expect(humid.final.components[0]!.massConcentration! * 1e6).toBeCloseTo(749, 0);
    const wet = planned({
      order: [['H2O', '0.1 %'], ['N2', 'balance']], to: '10 bar', parents: [{ key: 'wet', lines: [['H2O', '0.1 %'], ['N2', 'balance']] }],
      conditions: { concentrationPressure: { typed: '40 bar', reference: 'absolute' } },
    });
    expect(wet.final.components.map(({ massConcentration }) => massConcentration)).toEqual([null, null]);
  });
});
