import { describe, expect, it } from 'vitest';
import { emptyRecipe, planRecipe, recipeSentence } from '../../../src/blending/index.ts';
import type { LaboratoryValue } from '../../../src/blending/index.ts';
import { publishedOnly } from '../../../src/blending/values/value.ts';
import { laboratoryValueProblems, readLaboratoryValues } from '../../../src/blending/recipe/laboratory-values.ts';
import { FieldReader } from '../../../src/blending/recipe/reader.ts';
import { pascal } from '../../../src/units/index.ts';
import { jobOf, planned, recipeOf } from '../lab.ts';

const good: LaboratoryValue = { id: 'lfl:methane', value: '4,4', source: ' own copy ', date: '2026-12-01' };

function read(...values: readonly LaboratoryValue[]) {
  const reader = new FieldReader(pascal(101_325));
  return { values: readLaboratoryValues(reader, values), problems: reader.problems };
}

describe('readLaboratoryValues', () => {
  it('reads a number with decimal comma or point, and keeps source and date', () => {
    expect([...read(good).values]).toEqual([['lfl:methane', { value: 4.4, source: 'own copy', date: '2026-12-01' }]]);
    expect(read({ ...good, value: '1.5e-6' }).values.get('lfl:methane')?.value).toBe(1.5e-6);
    expect(read(good).problems).toEqual([]);
    expect(read().values).toBe(publishedOnly);
  });

  it.each([
    [{ value: '' }, 'entry', 'values.lfl:methane.value'],
    [{ value: 'four' }, 'entry', 'values.lfl:methane.value'],
    [{ value: '4.4 %' }, 'number-alone', 'values.lfl:methane.value'],
    [{ value: '0' }, 'not-positive', 'values.lfl:methane.value'],
    [{ value: '-4.4' }, 'not-positive', 'values.lfl:methane.value'],
    [{ value: '1e-12' }, 'value-beyond', 'values.lfl:methane.value'],
    [{ value: '1e10' }, 'value-beyond', 'values.lfl:methane.value'],
    [{ source: ' ' }, 'origin-missing', 'values.lfl:methane.source'],
    [{ date: '' }, 'origin-missing', 'values.lfl:methane.date'],
  ] as const)('refuses %j with %s', (change, code, field) => {
    const problems = laboratoryValueProblems({ ...good, ...change });
    expect(problems).toMatchObject([{ code, field }]);
    expect(recipeSentence(problems[0]!)).toMatch(/^[“A-Z].*\.$/u);
  });

  it('refuses one id twice', () => {
    expect(read(good, { ...good, value: '5' }).problems).toMatchObject([{ code: 'key-repeated', key: 'lfl:methane' }]);
  });
});

describe('a recipe with own values', () => {
  const fill = { order: [['CH4', '1 %'], ['N2', 'balance']], to: '100 bar' } as const;

  it('is planned with them, and changes nothing but the judgement', () => {
    const recipe = { ...recipeOf(fill), values: [{ ...good, id: 'oxidising-power', value: '21' }] };
    const answer = planRecipe(recipe);
    if (!answer.ok) throw new Error('not planned');
    expect(answer.value.job.values.get('oxidising-power')?.value).toBe(21);
    expect(answer.value.steps).toEqual(planned(fill).steps);
    expect(jobOf(fill).values).toBe(publishedOnly);
  });

  it('is not planned while one of them cannot be read', () => {
    const answer = planRecipe({ ...recipeOf(fill), values: [{ ...good, source: '' }] });
    expect(answer).toMatchObject({ ok: false, reason: { problems: [{ code: 'origin-missing', field: 'values.lfl:methane.source' }] } });
    expect(emptyRecipe.values).toEqual([]);
  });
});
