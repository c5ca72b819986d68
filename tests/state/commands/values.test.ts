import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../src/blending/index.ts';
import { putBackValue, setLaboratoryValue } from '../../../src/state/index.ts';

const methane = { id: 'lfl:methane', value: '5', source: 'own copy', date: '2026-12-01' };
const share = { id: 'hold-fuel-share', value: '0.2', source: 'own procedure', date: '2026-12-01' };

describe('commands on the laboratory’s own values', () => {
  it('set one value for each published one, a corrected one at its old place', () => {
    const two = setLaboratoryValue(share).apply(setLaboratoryValue(methane).apply(emptyRecipe));
    expect(two.values).toEqual([methane, share]);
    expect(setLaboratoryValue({ ...methane, value: '4.9' }).apply(two).values).toEqual([{ ...methane, value: '4.9' }, share]);
    expect(emptyRecipe.values).toEqual([]);
  });

  it('put one back and leave the others', () => {
    const two = setLaboratoryValue(share).apply(setLaboratoryValue(methane).apply(emptyRecipe));
    expect(putBackValue('lfl:methane').apply(two).values).toEqual([share]);
    expect(putBackValue('lfl:ethane').apply(two).values).toEqual([methane, share]);
  });

  it('name what they change for undo', () => {
    expect(setLaboratoryValue(methane).label(emptyRecipe)).toBe('own value of lfl:methane');
    expect(putBackValue('lfl:methane').label(emptyRecipe)).toBe('put back lfl:methane');
  });
});
