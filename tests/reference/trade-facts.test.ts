/** What every bench knows of mixing gases. All "common practice, no source", unless said; each follows from definitions. */
import { describe, expect, it } from 'vitest';
import { curvePoint, mixingCurve } from '../../src/blending/mixing/curve.ts';
import { mixingOfFill } from '../../src/blending/mixing/mixing.ts';
import { solveAmounts } from '../../src/blending/plan/amounts.ts';
import { fillStates } from '../../src/blending/plan/fill-states.ts';
import { settle } from '../../src/blending/steps/cylinder.ts';
import type { Vessel } from '../../src/blending/steps/cylinder.ts';
import { GAS_CONSTANT, idealModel } from '../../src/thermo/index.ts';
import { kelvin, pascal } from '../../src/units/index.ts';
import { jobOf, pure, valueOf } from '../blending/lab.ts';
import type { Fill } from '../blending/lab.ts';

/** A fill planned as if all gases were ideal. */
function ideally(fill: Fill) {
  const job = jobOf(fill);
  const model = valueOf(idealModel(job.gases));
  const vessel: Vessel = { cylinder: job.cylinder, barometer: job.conditions.barometer };
  const amounts = valueOf(solveAmounts(job, model, vessel));
  const order = job.parents.map((_, parent) => ({ parent, share: 1 }));
  const { steps } = valueOf(fillStates(job, model, vessel, amounts, order, new Float64Array(job.gases.length).fill(0.03)));
  const finished = valueOf(settle(model, vessel, amounts.finished, job.order.fillTemperature));
  return { job, steps, finished, mixing: valueOf(mixingOfFill(job, model, amounts, finished)) };
}

const four: Fill = { order: [['CO', '50 µmol/mol'], ['CO2', '5 %'], ['O2', '10 %'], ['N2', 'balance']], to: '150 bar' };

describe('ideal gases (common practice, no source)', () => {
  it('each addition raises the pressure by its mole fraction of the whole', () => {
    const { steps } = ideally(four);
    const rises = steps.map(({ rise }) => rise / 150e5);
    [50e-6, 0.05, 0.1, 0.84995].forEach((x, k) => expect(rises[k]! / x).toBeCloseTo(1, 10));
  });

  it('partial pressure over total pressure is the mole fraction; partial pressures add up', () => {
    const { steps, finished } = ideally(four);
    for (const { state } of [...steps, { state: finished }]) {
      const partial = [...state.amounts].map((amount) => (amount * GAS_CONSTANT * state.temperature) / state.volume);
      partial.forEach((p, i) => expect(p / state.pressure).toBeCloseTo(state.fractions[i]!, 14));
      expect(partial.reduce((sum, p) => sum + p, 0) / state.pressure).toBeCloseTo(1, 12);
    }
  });

  it('pressure is proportional to absolute temperature: 0.341 % per kelvin at 20 °C', () => {
    const { steps } = ideally({ ...four, at: { N2: '21 °C' } });
    expect((steps[3]!.state.pressure / 150e5 - 1) * 100).toBeCloseTo(0.341, 3);
  });
});

describe('mixing ideal gases at one temperature and pressure (common practice, no source)', () => {
  it('ΔG is RT Σ nᵢ ln xᵢ and ΔS is −R Σ nᵢ ln xᵢ, nothing else', () => {
    const { mixing, finished } = ideally(four);
    const sum = [...finished.amounts].reduce((total, n, i) => total + n * Math.log(finished.fractions[i]!), 0);
    expect(mixing.gibbsEnergy.total / (GAS_CONSTANT * 293.15 * sum)).toBeCloseTo(1, 12);
    expect(mixing.entropy.total / (-GAS_CONSTANT * sum)).toBeCloseTo(1, 12);
    // The blend stands at its fill pressure only within rounding, hence not exactly zero.
    expect(Math.abs(mixing.gibbsEnergy.pressure / mixing.gibbsEnergy.total)).toBeLessThan(1e-12);
    expect(Math.abs(mixing.gibbsEnergy.realGas)).toBeLessThan(1e-9);
    expect(Math.abs(mixing.enthalpy)).toBeLessThan(1e-9);
  });

  it('from parents at higher pressure, RT ln(p/p_parent) comes on top', () => {
    const { mixing, finished } = ideally({ ...four, parents: four.order.map(([gas]) => pure(gas, '300 bar')) });
    const expected = finished.total * GAS_CONSTANT * 293.15 * Math.log(150 / 300);
    expect(mixing.gibbsEnergy.pressure / expected).toBeCloseTo(1, 12);
  });

  it('ΔG is never positive, lowest at equal amounts of two gases, and there ΔS is highest: R ln 2', () => {
    const points = mixingCurve((gases) => idealModel(gases), 'helium', 'nitrogen', kelvin(293.15), pascal(150e5), 101);
    expect(points).toHaveLength(101);
    for (const point of points) {
      expect(point.gibbsEnergy).toBeLessThanOrEqual(0);
      expect(point.gibbsEnergy).toBeCloseTo(point.idealGibbsEnergy, 9);
      expect(point.entropy).toBeCloseTo(point.idealEntropy, 11);
    }
    const lowest = points.reduce((best, point) => (point.gibbsEnergy! < best.gibbsEnergy! ? point : best));
    const highest = points.reduce((best, point) => (point.entropy! > best.entropy! ? point : best));
    expect(lowest.x).toBe(0.5);
    expect(highest.x).toBe(0.5);
    expect(highest.entropy).toBeCloseTo(GAS_CONSTANT * Math.LN2, 10);
    expect(lowest.gibbsEnergy).toBeCloseTo(-GAS_CONSTANT * 293.15 * Math.LN2, 8);
  });

  it('which two gases does not matter', () => {
    const at = (first: 'helium' | 'argon', second: 'nitrogen' | 'oxygen') =>
      curvePoint(valueOf(idealModel([first, second])), kelvin(293.15), pascal(1e5), 0.3).idealGibbsEnergy;
    expect(at('helium', 'nitrogen')).toBe(at('argon', 'oxygen'));
  });

  it('a gas into the same gas: nothing mixes (the paradox of Gibbs)', () => {
    const { mixing } = ideally({ order: [['N2', '100 %']], to: '150 bar' });
    expect(mixing.gibbsEnergy.ideal).toBeCloseTo(0, 12);
    expect(mixing.entropy.ideal).toBeCloseTo(0, 12);
  });
});
