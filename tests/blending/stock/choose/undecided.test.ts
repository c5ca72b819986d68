import { describe, expect, it, vi } from 'vitest';
import { proposeFromStock } from '../../../../src/blending/stock/tools.ts';
import { valueOf } from '../../lab.ts';
import { onRack, orderOf, rack, today } from '../rack.ts';

/* The solver of the linear program gives up on everything, as it says of a program in which it runs in circles. */
vi.mock('yalps', () => ({ solve: () => ({ status: 'cycled', result: NaN, variables: [] }) }));

const n2 = onRack('n2', [['N2', '100 %']]);
const o2 = onRack('o2', [['O2', '100 %']]);

describe('a solver that gives up', () => {
  it('proves nothing: what the other method does not find either is undecided, not impossible', () => {
    const order = orderOf({ order: [['CO', '1 %'], ['N2', 'balance']], to: '100 bar' });
    for (const { answer } of valueOf(proposeFromStock(order, rack(n2, o2), today)).answers) {
      expect(answer).toMatchObject({ ok: false, reason: { code: 'undecided', setAside: [], barometer: expect.any(Number) as number } });
    }
  });

  it('leaves the other method to choose, which is not called the best', () => {
    const order = orderOf({ order: [['O2', '20 %'], ['N2', 'balance']], to: '100 bar' });
    for (const { answer } of valueOf(proposeFromStock(order, rack(n2, o2), today)).answers) {
      expect(valueOf(answer).proven).toBe(false);
      expect(valueOf(answer).parents.map(({ stock }) => stock)).toEqual(['o2', 'n2']);
    }
  });
});
