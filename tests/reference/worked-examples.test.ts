/**
 * Worked examples of the trade, by the program's own pipeline. All were
 * constructed for the purpose, none is a published measurement; the stops were
 * computed with the NIST code of GERG-2008 (R = 8.314472), in a rigid cylinder
 * at 20 °C unless said. Stops in bar absolute.
 */
import { describe, expect, it } from 'vitest';
import { amountToReach, settle } from '../../src/blending/steps/cylinder.ts';
import type { Vessel } from '../../src/blending/steps/cylinder.ts';
import { realModel } from '../../src/thermo/index.ts';
import { kelvin, pascal } from '../../src/units/index.ts';
import { fractionOf, idealStops, planned, residual, stops, valueOf } from '../blending/lab.ts';
import type { Line } from '../blending/lab.ts';

const GERG = { gasConstant: 'gerg2008' } as const;
const carbonDioxide = ['CO2', '5 %'] as const;
const nitrogen = ['N2', 'balance'] as const;
const m1 = planned({ order: [carbonDioxide, nitrogen], to: '150 bar' }, GERG);
const balanceFirst = planned({ order: [nitrogen, carbonDioxide], to: '150 bar' }, GERG);

const model = valueOf(realModel(['carbon dioxide', 'nitrogen'], GERG));
const rigid: Vessel = { cylinder: m1.job.cylinder, barometer: m1.job.conditions.barometer };
const roomTemperature = kelvin(293.15);
const empty = new Float64Array(2);
const pureCarbonDioxide = Float64Array.of(1, 0);
const pureNitrogen = Float64Array.of(0, 1);

describe('M1 (constructed; computed with the NIST GERG-2008 code): 5 % CO2 in N2, 150 bar', () => {
  it('compressibility factor and amount in 10 L', () => {
    expect(m1.finished.compressibilityFactor).toBeCloseTo(1.00069, 5);
    expect(m1.finished.total).toBeCloseTo(61.4986, 4);
  });

  it('stops with either gas first, real and ideal', () => {
    expect(stops(m1)[0]).toBeCloseTo(7.2033, 4);
    expect(idealStops(m1)[0]).toBeCloseTo(7.5, 10);
    expect(stops(balanceFirst)[0]).toBeCloseTo(144.957, 3);
    expect(idealStops(balanceFirst)[0]).toBeCloseTo(142.5, 10);
    expect(stops(m1)[1]).toBeCloseTo(150, 10);
  });

  it('masses', () => {
    const [first, second] = m1.steps;
    expect(first!.mass * 1e3).toBeCloseTo(135.326, 3);
    // The example has 28.0134 g/mol for nitrogen; atomic weights of 2021 make it 28.01371, 18 mg more.
    expect(second!.amount * 28.0134).toBeCloseTo(1636.65, 2);
    expect(second!.mass * 1e3).toBeCloseTo(1636.665, 3);
  });
});

describe('M2 (constructed; computed with the NIST GERG-2008 code): as M1, the CO2 reading came at 7.400', () => {
  const added = valueOf(amountToReach(model, rigid, empty, pureCarbonDioxide, pascal(7.4e5), roomTemperature));

  it('(a) going on to 150.00 makes 5.1394 %', () => {
    const balance = valueOf(amountToReach(model, rigid, Float64Array.of(added, 0), pureNitrogen, pascal(150e5), roomTemperature));
    expect((100 * added) / (added + balance)).toBeCloseTo(5.1394, 4);
  });

  it('(b) exactly 5 % needs a stop at 154.585', () => {
    const state = valueOf(settle(model, rigid, Float64Array.of(added, 19 * added), roomTemperature));
    expect(state.pressure / 1e5).toBeCloseTo(154.585, 3);
  });

  it('(c) venting back ends at the stop of M1', () => {
    const state = valueOf(settle(model, rigid, Float64Array.of(m1.steps[0]!.amount, 0), roomTemperature));
    expect(added).toBeGreaterThan(m1.steps[0]!.amount);
    expect(state.pressure / 1e5).toBeCloseTo(7.2033, 4);
  });
});

describe('M3 to M5 (constructed; computed with the NIST GERG-2008 code): variations of M1', () => {
  it('M3: 1.000 bar of nitrogen left in the cylinder', () => {
    const plan = planned({ order: [carbonDioxide, nitrogen], to: '150 bar', contents: residual('1.000 bar', [['N2', '100 %']]) }, GERG);
    expect(stops(plan)[0]).toBeCloseTo(8.1723, 4);
    expect(fractionOf(plan, 'carbon dioxide')).toBeCloseTo(0.05, 12);
  });

  it('M4: the last stop read at 27 °C or 15 °C, the first at 24 °C', () => {
    const readAt = (first: string, last: string) =>
      stops(planned({ order: [carbonDioxide, nitrogen], to: '150 bar', at: { CO2: first, N2: last } }, GERG));
    expect(readAt('20 °C', '27 °C')[1]).toBeCloseTo(154.928, 3);
    expect(readAt('20 °C', '15 °C')[1]).toBeCloseTo(146.475, 3);
    expect(readAt('24 °C', '27 °C')[0]).toBeCloseTo(7.3107, 4);
  });

  it('M5: a cylinder that grows 0.32 % unnoticed takes more nitrogen', () => {
    const growing: Vessel = { ...rigid, cylinder: { ...rigid.cylinder, pressureExpansion: 0.0032 / (150e5 - rigid.barometer) } };
    const first = m1.steps[0]!.amount;
    const balance = valueOf(amountToReach(model, growing, Float64Array.of(first, 0), pureNitrogen, pascal(150e5), roomTemperature));
    expect((100 * first) / (first + balance)).toBeCloseTo(4.984, 3);
  });

  it('M5: counted in the plan, the growth leaves exactly 5 %', () => {
    const plan = planned({ order: [carbonDioxide, nitrogen], to: '150 bar', cylinder: { pressureExpansion: '2.14e-5 /bar' } }, GERG);
    expect(plan.finished.volume / 0.01 - 1).toBeCloseTo(0.0032, 4);
    expect(fractionOf(plan, 'carbon dioxide')).toBeCloseTo(0.05, 12);
  });
});

describe('M6 (constructed; computed with the NIST GERG-2008 code): more stops, 150 bar', () => {
  it.each([
    ['CO2', '10 %', 'N2', 14.115, 15, 140, 135],
    ['CH4', '2.5 %', 'N2', 3.662, 3.75, 146.47, 146.25],
    ['O2', '20.9 %', 'N2', 30.628, 31.35, 119.14, 118.65],
    ['He', '10 %', 'N2', 14.525, 15, 131.31, 135],
    ['H2', '4 %', 'N2', 5.867, 6, 142.7, 144],
    ['CO', '1 %', 'N2', 1.469, 1.5, 148.39, 148.5],
    ['CH4', '10 %', 'Ar', 15.637, 15, 136.41, 135],
    ['CO2', '20 %', 'Ar', 28.829, 30, 131.38, 120],
    ['C3H8', '1 %', 'N2', 1.442, 1.5, 149.21, 148.5],
  ])('%s %s in %s', (gas, amount, balance, minorFirst, idealMinor, majorFirst, idealMajor) => {
    const minor: Line = [gas, amount];
    const major: Line = [balance, 'balance'];
    const up = planned({ order: [minor, major], to: '150 bar' }, GERG);
    const down = planned({ order: [major, minor], to: '150 bar' }, GERG);
    expect(stops(up)[0]).toBeCloseTo(minorFirst, 3);
    expect(idealStops(up)[0]).toBeCloseTo(idealMinor, 10);
    expect(stops(down)[0]).toBeCloseTo(majorFirst, 2);
    expect(idealStops(down)[0]).toBeCloseTo(idealMajor, 10);
  });
});

it('M7 (constructed; computed with the NIST GERG-2008 code): CH4 2.5, O2 18, N2 79.5 %, 100 bar', () => {
  const plan = planned({ order: [['CH4', '2.5 %'], ['N2', '79.5 %'], ['O2', '18 %']], to: '100 bar' }, GERG);
  expect(stops(plan)[0]).toBeCloseTo(2.5179, 4);
  expect(stops(plan)[1]).toBeCloseTo(82.498, 3);
  expect(stops(plan)[2]).toBeCloseTo(100, 10);
});
