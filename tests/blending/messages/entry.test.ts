import { describe, expect, it } from 'vitest';
import { entrySentence } from '../../../src/blending/index.ts';
import type { EntryProblem } from '../../../src/units/index.ts';
import { expectSentence } from './sentences.ts';

/** One problem of every code; a new code without an example does not compile. */
const examples: { readonly [Code in EntryProblem['code']]: Extract<EntryProblem, { code: Code }> } = {
  'empty': { code: 'empty', text: '' },
  'not-a-number': { code: 'not-a-number', text: ' warm ' },
  'ambiguous-number': { code: 'ambiguous-number', text: '1,500 bar', readings: [1.5, 1500] },
  'unknown-unit': { code: 'unknown-unit', text: '5 apples', unit: 'apples', understood: ['bar', 'psi'] },
  'ambiguous-unit': { code: 'ambiguous-unit', text: '5 mpa', unit: 'mpa', readings: ['mPa', 'MPa'] },
  'unit-missing': { code: 'unit-missing', text: '5', understood: ['%', 'µmol/mol'] },
  'below-absolute-zero': { code: 'below-absolute-zero', text: '-300 °C' },
  'below-vacuum': { code: 'below-vacuum', text: '-2 bar', reference: 'gauge' },
  'barometer-missing': { code: 'barometer-missing', text: '5 bar' },
  'negative': { code: 'negative', text: '-5 L' },
  'above-one': { code: 'above-one', text: '120 %' },
  'too-large': { code: 'too-large', text: '1e99 bar' },
};

describe('entrySentence', () => {
  it.each(Object.entries(examples))('%s', (_code, problem) => {
    const sentence = entrySentence(problem);
    expect(sentence).not.toMatch(/undefined|NaN/);
    expect(sentence).toMatch(/\.$/);
    // What is wrong is shown as typed: the unit where it is the unit, else the whole entry.
    if (problem.code !== 'barometer-missing') expect(sentence).toContain('unit' in problem ? problem.unit : problem.text.trim());
  });

  it('says both readings of an ambiguous number, without idle zeros', () => {
    expect(entrySentence(examples['ambiguous-number'])).toMatch(/read as 1\.5 or as 1.?500:/);
  });

  it('lists what is understood, and nothing where nothing is', () => {
    expect(entrySentence(examples['unknown-unit'])).toContain('understood are bar, psi');
    expectSentence(entrySentence({ ...examples['unit-missing'], understood: [] }));
  });
});
