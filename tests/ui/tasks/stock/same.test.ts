import { describe, expect, it } from 'vitest';
import { holdTheSame, saysTheSame } from '../../../../src/ui/tasks/stock/same.ts';

const one = { key: 'a', name: 'N2', pressure: { typed: '180 bar', reference: 'gauge' } };
const turned = { pressure: { reference: 'gauge', typed: '180 bar' }, name: 'N2', key: 'b' };

describe('comparing a copy with what it was copied from', () => {
  it('goes by what is said, not by the order of the fields nor by the key', () => {
    expect(saysTheSame(one, turned)).toBe(false);
    expect(saysTheSame(one, turned, ['key'])).toBe(true);
    expect(saysTheSame(one, { ...turned, pressure: { typed: '18 bar', reference: 'gauge' } }, ['key'])).toBe(false);
  });

  it('takes lists in any order, and none twice for one', () => {
    const other = { ...one, name: 'O2' };
    expect(holdTheSame([one, other], [other, turned], ['key'])).toBe(true);
    expect(holdTheSame([one, one], [one, other], ['key'])).toBe(false);
    expect(holdTheSame([one], [one, other], ['key'])).toBe(false);
  });
});
