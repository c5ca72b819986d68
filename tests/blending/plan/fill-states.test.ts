import { describe, expect, it } from 'vitest';
import { solveAmounts } from '../../../src/blending/plan/amounts.ts';
import { fillStates, massOf, STRIP_CELSIUS } from '../../../src/blending/plan/fill-states.ts';
import { cylinderVolume } from '../../../src/blending/steps/cylinder.ts';
import { airDensity, balanceReading } from '../../../src/blending/steps/weighing.ts';
import { gasRecord, realModel } from '../../../src/thermo/index.ts';
import { cubicMetre, kelvin, kilogram } from '../../../src/units/index.ts';
import { jobOf, planned, residual, stops, valueOf } from '../lab.ts';
import type { Fill } from '../lab.ts';

const fill: Fill = { order: [['CO2', '5 %'], ['O2', '10 %'], ['N2', 'balance']], to: '150 bar', cylinder: { material: 'aluminium', startReading: '12.5 kg' } };

describe('fillStates', () => {
  const plan = planned(fill);

  it('each state holds p V(p, T) = N Z R T', () => {
    for (const { state } of plan.steps) {
      const right = state.total * state.compressibilityFactor * plan.gasConstant * state.temperature;
      expect((state.pressure * state.volume) / right).toBeCloseTo(1, 13);
      expect(state.total / state.volume / state.density).toBeCloseTo(1, 13);
      const vessel = { cylinder: plan.job.cylinder, barometer: plan.job.conditions.barometer };
      expect(state.volume).toBeCloseTo(cylinderVolume(vessel, state.pressure, state.temperature), 15);
    }
  });

  it('settles each step at its own gas temperature', () => {
    const warm = planned({ ...fill, at: { O2: '27 °C' } });
    expect(warm.steps.map(({ state }) => state.temperature)).toEqual([293.15, 300.15, 293.15]);
    expect(stops(warm)[0]).toBe(stops(plan)[0]);
    expect(stops(warm)[1]! / stops(plan)[1]!).toBeGreaterThan(300.15 / 293.15);
    expect(stops(warm)[2]).toBeCloseTo(stops(plan)[2]!, 10);
  });

  it('the strip runs through the stop at its own temperature', () => {
    for (const step of plan.steps) {
      expect(step.strip.map(({ temperature }) => temperature)).toEqual(STRIP_CELSIUS.map((celsius) => 273.15 + celsius));
      expect(step.strip[2]!.pressure / step.state.pressure).toBeCloseTo(1, 13);
    }
  });

  it('rises are the differences of the readings; the first is over the residual', () => {
    expect(plan.steps.map(({ rise }) => rise / 1e5).reduce((sum, rise) => sum + rise, 0)).toBeCloseTo(stops(plan)[2]!, 6);
    const left = planned({ ...fill, contents: residual('1 bar', [['N2', '100 %']]) });
    expect(left.start!.pressure / 1e5).toBeCloseTo(1, 12);
    expect(left.steps[0]!.rise / 1e5).toBeCloseTo(stops(left)[0]! - 1, 10);
  });

  it('weighs the gas, the buoyancy of the weights and of the growing cylinder', () => {
    const { conditions } = plan.job;
    const air = airDensity(conditions.roomTemperature, conditions.barometer, conditions.relativeHumidity);
    let before = 0;
    let mass = 0;
    for (const { mass: added, state, weighing } of plan.steps) {
      mass += added;
      expect(weighing.cumulativeMass).toBeCloseTo(mass, 12);
      expect(weighing.cumulativeGain).toBeCloseTo(balanceReading(kilogram(mass), cubicMetre(state.volume - 0.01), air), 12);
      expect(weighing.readingGain).toBeCloseTo(weighing.cumulativeGain - before, 12);
      expect(weighing.reading).toBeCloseTo(12.5 + weighing.cumulativeGain, 12);
      before = weighing.cumulativeGain;
    }
    // Growth 0.32 % of 10 L in air of 1.2 g/L takes 38 mg off, the weights' own buoyancy adds 0.015 %.
    const last = plan.steps[2]!.weighing;
    expect((last.cumulativeGain - last.cumulativeMass * 1.00015) * 1e6).toBeCloseTo(-38, -1);
  });

  it('without a start reading only the gains are planned', () => {
    const unread = planned({ ...fill, cylinder: { material: 'aluminium' } });
    expect(unread.steps.map(({ weighing }) => weighing.reading)).toEqual([null, null, null]);
    expect(unread.steps[1]!.weighing.readingGain).toBeCloseTo(plan.steps[1]!.weighing.readingGain, 14);
  });

  it('a perfect vacuum has no state before the first addition', () => {
    expect(planned(fill).start).toBeNull();
    expect(planned({ ...fill, contents: { state: 'evacuated', pressure: { typed: '0.01 mbar', reference: 'absolute' } } }).start!.pressure).toBeCloseTo(1, 9);
  });

  it('names the step at which the gas would condense', () => {
    const cold = jobOf({ order: [['C3H8', '5 %'], ['N2', 'balance']], to: '50 bar', at: { C3H8: '-35 °C' } });
    const model = valueOf(realModel(cold.gases));
    const vessel = { cylinder: cold.cylinder, barometer: cold.conditions.barometer };
    const amounts = valueOf(solveAmounts(cold, model, vessel));
    const masses = Float64Array.from(cold.gases, (gas) => gasRecord(gas).molarMass.value);
    // 2.2 bar of propane at −35 °C, where its vapour pressure is 1.4 bar: not seen by settling alone unless unstable.
    const many = { ...amounts, additions: amounts.additions.map((amount, s) => (s === 0 ? amount * 8 : amount)) };
    expect(fillStates(cold, model, vessel, many, [{ parent: 0, share: 1 }, { parent: 1, share: 1 }], masses)).toMatchObject({ ok: false, reason: { code: 'step-state', step: 1 } });
  });
});

describe('massOf', () => {
  it('is Σ nᵢ Mᵢ', () => {
    expect(massOf(Float64Array.of(2, 3), Float64Array.of(0.028, 0.032))).toBeCloseTo(0.152, 15);
    expect(massOf(new Float64Array(0), new Float64Array(0))).toBe(kelvin(0));
  });
});
