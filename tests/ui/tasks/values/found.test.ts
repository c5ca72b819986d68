import { describe, expect, it } from 'vitest';
import { loadPublishedValues } from '../../../../src/blending/index.ts';
import { foundValues, groupedValues, valueText } from '../../../../src/ui/tasks/values/found.ts';

const list = await loadPublishedValues();
const own = [{ id: 'lfl:methane', value: '5', source: 'own copy', date: '2026-12-01' }];
const ids = (text: string, onlyOwn = false): readonly string[] => foundValues(list, text, own, onlyOwn).map(({ id }) => id);

describe('the search of the list', () => {
  it('finds everything for nothing, and a gas by formula or number', () => {
    expect(ids('  ')).toHaveLength(list.length);
    expect(ids('NH3')).toEqual(expect.arrayContaining(['lfl:ammonia', 'lc50:ammonia']));
    expect(ids('7664-41-7').every((id) => id.endsWith(':ammonia'))).toBe(true);
    expect(ids('NH3')).not.toContain('lfl:methane');
  });

  it('finds a quantity by a word of it, and only what is replaced when asked', () => {
    expect(ids('LC50')).toContain('lc50:chlorine');
    expect(ids('', true)).toEqual(['lfl:methane']);
    expect(ids('chlorine', true)).toEqual([]);
    expect(ids('no such thing')).toEqual([]);
  });
});

describe('the table', () => {
  it('puts the values of one quantity under it', () => {
    const groups = groupedValues(list.filter(({ section }) => section === 'Flammability'));
    expect(groups.find(({ quantity }) => quantity === 'Lower flammable limit in air')?.values.every(({ id }) => id.startsWith('lfl:'))).toBe(true);
    expect(groups.flatMap(({ values }) => values)).toHaveLength(list.filter(({ section }) => section === 'Flammability').length);
  });

  it('shows a ratio without a unit', () => {
    expect([valueText(0.25, ''), valueText('4,4', '%')]).toEqual(['0.25', '4,4 %']);
  });
});
