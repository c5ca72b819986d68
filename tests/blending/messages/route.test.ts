import { describe, expect, it } from 'vitest';
import { pascal } from '../../../src/units/index.ts';
import { costAgainst, criterionText, faultText, orderProblemSentence, orderText, whySentence } from '../../../src/blending/messages/route.ts';
import { criteria, costFrom } from '../../../src/blending/route/criteria.ts';
import type { RouteFault } from '../../../src/blending/route/data.ts';
import { jobOf } from '../lab.ts';

const job = jobOf({ order: [['CH4', '1 %'], ['N2', 'balance']], to: '100 bar' });
const cost = costFrom([0, 0, 1, 0, 0, 250_000, 48, 278]);

describe('sentences about the order of addition', () => {
  it('name every criterion', () => {
    expect(criteria.map((criterion) => criterionText[criterion]).every((text) => text.length > 0)).toBe(true);
  });

  it('show two costs with as many digits as tell them apart', () => {
    expect(costAgainst('gas', cost, { ...cost, gas: 0.392 })).toBe('0.28 mol against 0.39 mol');
    expect(costAgainst('gas', cost, { ...cost, gas: 0.279 })).toBe('0.278 mol against 0.279 mol');
    expect(costAgainst('cautions', cost, { ...cost, cautions: 3 })).toBe('1 against 3');
    expect(costAgainst('gauge', cost, { ...cost, gauge: 1 })).toBe('0.50 tolerances against 1.00 tolerances');
  });

  it('write an order by its parents, a part with its share', () => {
    expect(orderText(job, [{ parent: 1, share: 0.25 }, { parent: 0, share: 1 }, { parent: 1, share: 0.75 }]))
      .toBe('Parent N2 (25 % of it), then Parent CH4, then Parent N2 (75 % of it)');
    expect(whySentence(job, { code: 'decided', criterion: 'time', runnerUp: { arrangement: [{ parent: 0, share: 1 }], cost: { ...cost, time: 51 } } }, cost))
      .toBe('Chosen over Parent CH4 by time: 48 min against 51 min.');
  });

  it('say what is wrong at a step, with every pressure absolute and the weight of it', () => {
    const faults: readonly RouteFault[] = [
      { code: 'together', verdict: 'hold', finished: false, fuelOfLfl: 3.79, oxygen: 0.833 },
      { code: 'boundary', verdict: 'caution', oxidiserEnters: false, fuelOfLfl: 0.9, oxygen: 0.05 },
      { code: 'stop', verdict: 'hold', limit: pascal(120e5) },
      { code: 'condensation', verdict: 'hold', by: 'separates' },
      { code: 'supply', verdict: 'hold', by: 'too-low', pressure: pascal(50e5) },
      { code: 'unmeasured', verdict: 'hold', relative: 0.1, limit: 0.01 },
      { code: 'not-gas', verdict: 'none', phase: 'not tested' },
      { code: 'falls', verdict: 'none', grade: 2, left: pascal(90e5) },
    ];
    const texts = faults.map((fault) => faultText(job, fault, 'Parent CH4', pascal(100e5)));
    expect(texts).toEqual([
      'fuel at 379 % of its lower flammable limit stands with 83.3 % oxygen at 100.0 bar absolute: a hold',
      'fuel (Parent CH4) meets oxidiser: fuel at 90.0 % of its lower flammable limit against 5.00 % oxygen: a caution',
      'the stop of 100.0 bar absolute stands above the working pressure of 120.0 bar absolute: a hold',
      'the gas separates at 100.0 bar absolute: a hold',
      'Parent CH4 stands at 50.0 bar absolute for a stop of 100.0 bar absolute: a hold',
      'the gauge knows the rise to 10.0 % only, with a tolerance of 1.0 %: a hold',
      'the state at 100.0 bar absolute could not be shown to be one gas',
      'Parent CH4 falls to 90.0 bar absolute as it is drawn, below the stop of 100.0 bar absolute',
    ]);
  });

  it('say why there is no order to propose', () => {
    expect(orderProblemSentence(job, { code: 'too-many-parents', parents: 13, most: 12 })).toContain('up to 12');
    expect(orderProblemSentence(job, { code: 'arrangement-invalid', parent: 1 })).toBe('The order does not bring Parent N2 exactly once as a whole.');
  });
});
