import { describe, expect, it } from 'vitest';
import { recipeSentence } from '../../../src/blending/index.ts';
import { condensationCurve, lowestGasTemperature } from '../../../src/blending/curves/index.ts';
import type { Plan } from '../../../src/blending/index.ts';
import { realModel, testStability } from '../../../src/thermo/index.ts';
import { celsius, kelvin } from '../../../src/units/index.ts';
import { settle } from '../../../src/blending/steps/cylinder.ts';
import { planned, pure, refused, valueOf } from '../lab.ts';
import type { Fill } from '../lab.ts';

const propane: Fill = { order: [['C3H8', '5 %'], ['CO2', '5 %'], ['N2', 'balance']], to: '60 bar', conditions: { coldestStorage: '-40 °C' } };

/** Whether the closed, finished cylinder is one gas at a temperature. */
function isGasAt(plan: Plan, temperature: number): boolean {
  const model = valueOf(realModel(plan.job.gases));
  const state = valueOf(settle(model, { cylinder: plan.job.cylinder, barometer: plan.job.conditions.barometer }, plan.finished.amounts, kelvin(temperature)));
  return valueOf(testStability(model, kelvin(temperature), state.pressure, state.fractions)).stable;
}

describe('the phase part of a plan', () => {
  it('tests every state at its own temperature', () => {
    const { phase } = planned(propane);
    expect(phase).toMatchObject({ start: null, steps: [{ phase: 'gas' }, { phase: 'gas' }, { phase: 'gas' }], finished: { phase: 'gas' } });
    expect(planned({ order: [['O2', '21 %'], ['N2', 'balance']], to: '150 bar' }).phase.finished).toEqual({ phase: 'supercritical' });
  });

  it('uses the temperature of each step: 6.5 % propane first is a gas at 20 °C and separates at 10 °C', () => {
    // Computed table: propane 6.37 bar absolute at 10 °C, 8.37 bar at 20 °C.
    const at = (temperature: string): Plan => planned({ order: [['C3H8', '6.5 %'], ['N2', 'balance']], to: '130 bar', at: { C3H8: temperature } });
    expect(at('20 °C').phase.steps[0]).toEqual({ phase: 'gas' });
    expect(at('20 °C').steps[0]!.state.pressure / 1e5).toBeGreaterThan(7.2);
    expect(at('10 °C').phase.steps[0]).toMatchObject({ phase: 'unstable' });
  });

  it('the largest fill for the coldest temperature is at its dew point there', () => {
    const { coldest, finished } = { ...planned(propane).phase, finished: planned(propane).finished };
    const largest = valueOf(coldest!.largestFill)!;
    expect(largest.forming).toEqual({ gas: 'propane', ice: false });
    expect(largest.pressure).toBeLessThan(finished.pressure);
    const bars = largest.pressure / 1e5;
    const at = (factor: number): Plan => planned({ ...propane, to: `${(bars * factor).toFixed(6)} bar` });
    expect(isGasAt(at(0.9999), 233.15)).toBe(true);
    expect(isGasAt(at(1.0001), 233.15)).toBe(false);
  });

  it('says that nothing limits the fill where nothing condenses, and nothing where no coldest temperature is stated', () => {
    const dry: Fill = { order: [['O2', '21 %'], ['N2', 'balance']], to: '150 bar', conditions: { coldestStorage: '-40 °C' } };
    expect(planned(dry).phase.coldest!.largestFill).toEqual({ ok: true, value: null });
    expect(planned({ ...dry, conditions: {} }).phase.coldest).toBeNull();
  });

  it('judges it: a fill above the largest is held', () => {
    const verdicts = (to: string): unknown[] => planned({ ...propane, to }).findings.filter(({ rule }) => rule === 'condensation-in-storage').map(({ verdict }) => verdict);
    expect(verdicts('60 bar')).toEqual(['hold']);
    expect(verdicts('20 bar')).toEqual(['note']);
  });

  it('says of which pairs nobody measured a phase boundary, traces included', () => {
    expect(planned(propane).phase.guessedPairs).toEqual([]);
    const { guessedPairs } = planned({ order: [['O2', '5 µmol/mol'], ['CO2', '5 %'], ['N2', 'balance']], to: '50 bar' }).phase;
    expect(guessedPairs).toEqual([['carbon dioxide', 'oxygen']]);
  });
});

describe('the lowest temperature at which the filled cylinder stays gas', () => {
  it('parts gas from not gas', () => {
    const plan = planned({ ...propane, to: '30 bar' });
    const lowest = valueOf(lowestGasTemperature(plan))!;
    expect(lowest.forming.gas).toBe('propane');
    expect(isGasAt(plan, lowest.temperature + 0.01)).toBe(true);
    expect(isGasAt(plan, lowest.temperature - 0.01)).toBe(false);
    expect(lowest.pressure).toBeLessThan(plan.finished.pressure);
  });

  it('is null for air', () => {
    expect(lowestGasTemperature(planned({ order: [['O2', '21 %'], ['N2', 'balance']], to: '150 bar' }))).toEqual({ ok: true, value: null });
  });
});

describe('the condensation curve', () => {
  const plan = planned({ ...propane, to: '30 bar' });
  const lowest = valueOf(lowestGasTemperature(plan))!;
  const curve = condensationCurve(plan);

  it('has 40 fills up to half as much again as planned', () => {
    expect(curve).toHaveLength(40);
    expect(curve.at(-1)!.fillPressure / plan.finished.pressure).toBeCloseTo(1.5, 12);
    // The thinnest fills stay gas down to the end of the search.
    expect(curve.slice(3).every(({ temperature }) => temperature !== null)).toBe(true);
  });

  it('passes through the plan: its own fill at its own lowest temperature', () => {
    const next = curve.findIndex(({ fillPressure }) => fillPressure > plan.finished.pressure);
    expect(curve[next - 1]!.temperature).toBeLessThan(lowest.temperature + 1e-6);
    expect(curve[next]!.temperature).toBeGreaterThan(lowest.temperature);
  });

  it('is the largest fill read the other way round', () => {
    const { fillPressure, temperature } = curve[20]!;
    const cold = `${String(celsius(temperature!))} °C`;
    const largest = valueOf(planned({ ...propane, to: '30 bar', conditions: { coldestStorage: cold } }).phase.coldest!.largestFill)!;
    expect(largest.pressure / fillPressure).toBeCloseTo(1, 5);
  });

  it('turns back where the gas takes its liquid up again', () => {
    const temperatures = condensationCurve(planned({ ...propane, to: '150 bar' })).flatMap(({ temperature }) => (temperature === null ? [] : [Number(temperature)]));
    const warmest = temperatures.indexOf(Math.max(...temperatures));
    expect(warmest).toBeGreaterThan(5);
    expect(warmest).toBeLessThan(temperatures.length - 1);
  });
});

describe('a blend that would be liquefied', () => {
  it('is refused, and the sentence names the gas and says that no filling ratio is given', () => {
    const [problem] = refused({ order: [['C3H8', '60 %'], ['N2', 'balance']], to: '50 bar' });
    expect(problem).toMatchObject({ code: 'no-state', condenses: 'propane' });
    expect(recipeSentence(problem!)).toMatch(/C₃H₈ condenses first.*no filling ratio/u);
  });

  it('a step that would be liquid is refused likewise', () => {
    const [problem] = refused({ order: [['C3H8', '25 %'], ['N2', 'balance']], to: '150 bar' });
    expect(problem).toMatchObject({ code: 'no-state', where: 'step 1', condenses: 'propane' });
  });

  it('a step that only just separates has figures, and is held', () => {
    const plan = planned({ order: [['C3H8', '12 %'], ['N2', 'balance']], to: '150 bar' });
    expect(plan.phase.steps[0]).toEqual({ phase: 'unstable', forming: { gas: 'propane', ice: false } });
    expect(plan.findings).toContainEqual(expect.objectContaining({ id: 'condensation-at-step:step-1', verdict: 'hold' }));
  });

  it('a reason that is not condensation blames no gas', () => {
    expect(refused({ order: [['N2', '100 %']], to: '50 bar', parents: [pure('O2')] })[0]).not.toHaveProperty('condenses');
  });
});
