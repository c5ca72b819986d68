import { describe, expect, it } from 'vitest';
import { STANDARD_PRESSURE } from '../../../src/blending/index.ts';
import type { Mixing } from '../../../src/blending/index.ts';
import { realModel } from '../../../src/thermo/index.ts';
import { planned, pure, residual, valueOf } from '../lab.ts';
import type { Fill } from '../lab.ts';

const fill: Fill = {
  order: [['CO2', '5 %'], ['O2', '10 %'], ['N2', 'balance']], to: '150 bar', parents: [pure('CO2', '50 bar'), pure('O2', '180 bar'), pure('N2', '200 bar')],
};
const plan = planned(fill);
const mixing = valueOf(plan.mixing);

describe('mixingOfFill', () => {
  it('splits add up and ΔG = ΔH − TΔS', () => {
    for (const { total, ideal, pressure, realGas } of [mixing.gibbsEnergy, mixing.entropy]) {
      expect(ideal + pressure + realGas).toBeCloseTo(total, 9);
    }
    expect(mixing.gibbsEnergy.total).toBeCloseTo(mixing.enthalpy - mixing.temperature * mixing.entropy.total, 6);
  });

  it('is the difference of the chemical potentials, worked out on another path', () => {
    // ΔG = Σ nᵢ RT ln(fᵢ blend / fᵢ parent), with the fugacities of two separate state calls.
    let expected = 0;
    for (const [s, step] of plan.steps.entries()) {
      const parent = plan.job.parents[s]!;
      const pureState = valueOf(valueOf(realModel([plan.job.gases[s]!])).stateAtPressure(mixing.temperature, parent.pressure!, [1]));
      const gas = mixing.potentials.find((potential) => potential.gas === s)!;
      const before = plan.gasConstant * mixing.temperature * (Math.log(parent.pressure! / 1e5) + pureState.lnFugacityCoefficients[0]!);
      expected += step.amount * (gas.relative - before);
    }
    expect(mixing.gibbsEnergy.total / expected).toBeCloseTo(1, 10);
  });

  it('goes downhill: parents at higher pressure, then mixed', () => {
    expect(mixing.gibbsEnergy.ideal).toBeLessThan(0);
    expect(mixing.entropy.ideal).toBeGreaterThan(0);
    // CO₂ comes from 50 bar to 150, but the other gases fall further.
    expect(mixing.gibbsEnergy.pressure).toBeLessThan(0);
  });

  it('potentials: μ − μ° = RT ln(x φ p/p°), in three parts', () => {
    for (const { relative, idealMixing, pressure, realGas } of mixing.potentials) {
      expect(idealMixing + pressure + realGas).toBeCloseTo(relative, 9);
    }
    expect(mixing.potentials.map(({ gas }) => gas)).toEqual([0, 1, 2]);
  });

  it('the standard pressure moves the potentials and nothing else', () => {
    const other: Mixing = valueOf(planned({ ...fill, conditions: { standardPressure: '1 atm' } }).mixing);
    // Published: 1 atm = 101 325 Pa, so RT ln 1.01325 lies between them.
    expect(STANDARD_PRESSURE).toEqual({ '1 bar': 1e5, '1 atm': 101325 });
    expect(other.standardPressure).toBe(101325);
    expect(mixing.potentials[0]!.relative - other.potentials[0]!.relative).toBeCloseTo(8.314462618 * 293.15 * Math.log(1.01325), 8);
    expect(other.gibbsEnergy).toEqual(mixing.gibbsEnergy);
    expect(other.entropy).toEqual(mixing.entropy);
  });

  it('a residual is a source of its own, at its own pressure', () => {
    const left = valueOf(planned({ ...fill, contents: residual('2 bar', [['N2', '100 %']]) }).mixing);
    expect(left.sources[0]).toMatchObject({ parent: null, assumed: false, pressure: 2e5 });
    expect(left.sources.reduce((sum, { amount }) => sum + amount, 0)).toBeCloseTo(left.amount, 10);
  });

  it('a premix is mixed already: only its own share of ln(x/y) counts', () => {
    const dilution = valueOf(planned({
      order: [['CO', '50 µmol/mol'], ['N2', 'balance']], to: '100 bar',
      parents: [{ key: 'a', lines: [['CO', '1 %'], ['N2', 'balance']], pressure: '150 bar' }, pure('N2', '200 bar')],
    }).mixing);
    const [premix, nitrogen] = dilution.sources;
    const byHand = -8.314462618 * (premix!.amount * (0.01 * Math.log(50e-6 / 0.01) + 0.99 * Math.log(0.99995 / 0.99)) + nitrogen!.amount * Math.log(0.99995));
    expect(dilution.entropy.ideal / byHand).toBeCloseTo(1, 9);
  });

  it('an unstated parent pressure is taken as the blend’s own, and marked', () => {
    const unstated = valueOf(planned({ order: [['O2', '10 %'], ['N2', 'balance']], to: '150 bar' }).mixing);
    expect(unstated.sources.every(({ assumed, pressure }) => assumed && Math.abs(pressure / 150e5 - 1) < 1e-12)).toBe(true);
    expect(unstated.gibbsEnergy.pressure / unstated.gibbsEnergy.total).toBeCloseTo(0, 12);
  });

  it('a parent that is no gas at the blend’s temperature has no figure, and is named', () => {
    const liquid = planned({ ...fill, parents: [pure('CO2', '70 bar'), pure('O2', '180 bar'), pure('N2', '200 bar')] }).mixing;
    expect(liquid).toMatchObject({ ok: false, reason: { code: 'mixing-state', source: 'CO2', reason: { code: 'no-gas-root' } } });
  });
});
