import { describe, expect, it } from 'vitest';
import { emptyRecipe, planRecipe } from '../../../src/blending/index.ts';
import { balanceWords, cylinderFromStock, demoStock, gaugeFromStock, parentFromStock, refreshedCylinder, shareText, thermometerWords } from '../../../src/blending/stock/tools.ts';

const [first] = demoStock.cylinders;
const gauge = (typed: string) => ({ typed, reference: 'gauge' }) as const;

describe('what a recipe copies of the stock', () => {
  it('is the whole parent, with where it came from', () => {
    const entry = demoStock.parents[0]!;
    expect(parentFromStock(entry, 'p1')).toEqual({ ...entry, key: 'p1', stock: entry.key });
  });

  it('is the gauge without its place', () => {
    const [gaugeOfStock] = demoStock.gauges;
    expect(gaugeFromStock(gaugeOfStock!, 'a')).toEqual({ ...gaugeOfStock, key: 'a', location: undefined });
    expect(gaugeFromStock(gaugeOfStock!, 'a')).not.toHaveProperty('location');
  });

  it('is the cylinder with the stricter of its two marks, each at its own temperature', () => {
    const marked = (working: string, service: string): readonly string[] => {
      const { workingPressure, workingPressureTemperature } = cylinderFromStock({ ...first!, workingPressure: gauge(working), servicePressure: gauge(service) });
      return [workingPressure.typed, workingPressureTemperature];
    };
    expect(marked('150 bar', '')).toEqual(['150 bar', '15 °C']);
    expect(marked('', '2216 psi')).toEqual(['2216 psi', '21.1 °C']);
    expect(marked('', '')).toEqual(['', '15 °C']);
    // Both sides of the limit: 150 bar at 15 °C is 153.2 bar at 21.1 °C for an ideal gas (absolute 151.013 × 294.25/288.15 = 154.21).
    expect(marked('150 bar', '153.1 bar')).toEqual(['153.1 bar', '21.1 °C']);
    expect(marked('150 bar', '153.3 bar')).toEqual(['150 bar', '15 °C']);
    // What cannot be read is asked for, never passed over.
    expect(marked('150 bar', 'as stamped')).toEqual(['as stamped', '21.1 °C']);
    expect(marked('unreadable', '100 bar')).toEqual(['unreadable', '15 °C']);
  });

  it('leaves the contents to be stated, which holds the plan', () => {
    const cylinder = cylinderFromStock(first!);
    expect(cylinder.contents.state).toBe('not stated');
    expect(cylinder.startReading).toBe('');
    const answer = planRecipe({
      ...emptyRecipe, cylinder, parents: [parentFromStock(demoStock.parents[0]!, 'n2')],
      order: { components: [{ gas: 'N2', amount: '100 %', tolerance: '' }], fillPressure: gauge('100 bar'), fillTemperature: '20 °C' },
    });
    expect(answer.ok && answer.value.findings.some(({ rule, verdict }) => rule.startsWith('contents') && verdict === 'hold')).toBe(true);
  });

  it('has words for the instruments on the sheet', () => {
    expect(demoStock.thermometers.map(thermometerWords)).toEqual([
      'T1, -20 °C to 60 °C, ±0.2 K, calibrated 2026-03-02', 'T2, strapped to the cylinder, -40 °C to 120 °C, ±0.5 K, calibrated 2025-12-15',
    ]);
    expect(demoStock.balances.map(balanceWords)).toEqual([
      'W1, up to 32 kg, ±0.2 g, calibrated 2026-06-22', 'W2, up to 64 kg, ±0.003 % of span, calibrated 2026-06-22',
    ]);
    expect(balanceWords({ ...demoStock.balances[0]!, capacity: '', accuracy: '', calibrated: '' })).toBe('W1');
    expect([0.5, 0.1261, 0.0627, 0.0012].map(shareText)).toEqual(['50 %', '13 %', '6.3 %', '0.12 %']);
  });
});

describe('a cylinder brought up to date', () => {
  it('takes what the stock says now and keeps what no list knows', () => {
    const entry = demoStock.cylinders[0]!;
    const copy = { ...cylinderFromStock(entry), startReading: '12.01 kg', pressureExpansion: '1e-5' };
    expect(refreshedCylinder(entry, copy)).toEqual(copy);
    expect(refreshedCylinder({ ...entry, testDue: '2036-04-30' }, copy)).toEqual({ ...copy, testDue: '2036-04-30' });
  });
});
