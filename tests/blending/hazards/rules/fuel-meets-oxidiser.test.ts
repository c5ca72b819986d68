import { describe, expect, it } from 'vitest';
import { verdictsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { Addition } from '../../../fixtures/unchecked-plan.ts';

const rule = 'fuel-meets-oxidiser';
const parents = {
  methane: { mix: { methane: 1 } },
  nitrogen: { mix: { nitrogen: 1 } },
  oxygen: { mix: { oxygen: 1 } },
  air: { mix: { nitrogen: 0.79, oxygen: 0.21 } },
  lean: { mix: { methane: 0.01, nitrogen: 0.99 } },
} as const;
const judge = (...additions: Addition[]): unknown => verdictsOf(rule, planFixture({ parents, additions }));

// Limits: methane 4.4 % (IEC 60079-20-1), 10.7 % oxygen (ASTM E2079-19).
describe(rule, () => {
  it('holds oxygen let into fuel even if the mixed state holds hardly any oxygen', () => {
    expect(judge(['nitrogen', 50], ['methane', 50], ['oxygen', 0.1])).toEqual({ [`${rule}:step-3`]: 'hold' });
  });

  it('holds fuel let into oxidiser even if the mixed state is far below the flammable limit', () => {
    expect(judge(['air', 100], ['methane', 0.1])).toEqual({ [`${rule}:step-2`]: 'hold' });
  });

  it('holds oxygen onto fuel too dilute to burn in air: methane 8 % in nitrogen, Tci 8.7 %', () => {
    expect(judge(['methane', 8], ['nitrogen', 92], ['oxygen', 5])).toEqual({ [`${rule}:step-3`]: 'hold' });
  });

  it('is a caution once the fuel is below its lower flammable limit, as in the route of M7', () => {
    expect(judge(['methane', 2.5], ['nitrogen', 79.5], ['oxygen', 18])).toEqual({ [`${rule}:step-3`]: 'caution' });
  });

  it('changes from caution to hold where a ratio on the boundary reaches both limits', () => {
    // With half the limiting oxygen (5.35 %) at the boundary: fuel x(1 − 0.0535) = 4.4 % at x = 4.65 %.
    expect(judge(['methane', 4.6], ['nitrogen', 95.4], ['oxygen', 10])).toEqual({ [`${rule}:step-3`]: 'caution' });
    expect(judge(['methane', 4.7], ['nitrogen', 95.3], ['oxygen', 10])).toEqual({ [`${rule}:step-3`]: 'hold' });
  });

  it('says nothing of fuel below a quarter of its limit, nor of inert gas', () => {
    expect(judge(['lean', 50], ['air', 50])).toEqual({});
    expect(judge(['air', 50], ['lean', 50])).toEqual({});
    expect(judge(['methane', 50], ['nitrogen', 50])).toEqual({});
    expect(judge(['air', 50], ['nitrogen', 50])).toEqual({});
  });

  it('says nothing when inert gas dilutes a mixture that holds both; that state has its own finding', () => {
    expect(judge(['methane', 1], ['oxygen', 9], ['nitrogen', 90])).toEqual({ [`${rule}:step-2`]: 'hold' });
  });

  it('notes fuel let onto air left by an evacuation, and holds it onto air at atmospheric pressure', () => {
    const onAir = (bar: number): unknown => verdictsOf(rule, planFixture({
      parents, additions: [['methane', 50]], start: { mix: { nitrogen: 0.79, oxygen: 0.21 }, bar },
    }));
    // Own choice: up to 50 mbar absolute of flammable mixture; air at 1 mbar makes 4 mbar of it.
    expect(onAir(0.001)).toEqual({ [`${rule}:step-1`]: 'note' });
    expect(onAir(0.02)).toEqual({ [`${rule}:step-1`]: 'hold' });
    expect(onAir(1)).toEqual({ [`${rule}:step-1`]: 'hold' });
  });
});
