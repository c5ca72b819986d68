import { describe, expect, it } from 'vitest';
import { findingsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { Mix } from '../../../fixtures/unchecked-plan.ts';

const rule = 'toxic-gas';
const judge = (mix: Mix): unknown => findingsOf(rule, planFixture({ parents: { gas: { mix } }, additions: [['gas', 100]] }));

// LC50 of ISO 10298, from memory: CO 3760, H2S 712 µmol/mol.
describe(rule, () => {
  it('names the LC50 of the mixture: 5 % CO with 1 % H2S', () => {
    expect(judge({ 'carbon monoxide': 0.05, 'hydrogen sulfide': 0.01, nitrogen: 0.94 })).toMatchObject([
      { verdict: 'caution', figure: 'LC50 36573 µmol/mol', limit: '5000 µmol/mol', trust: 'from memory' },
    ]);
  });

  it('says on which side of 5000 and 200 µmol/mol the mixture lies', () => {
    expect(judge({ 'hydrogen sulfide': 0.143, nitrogen: 0.857 })).toMatchObject([{ detail: expect.stringMatching(/^Toxic by transport/u) as string }]);
    expect(judge({ 'hydrogen sulfide': 0.142, nitrogen: 0.858 })).toMatchObject([{ detail: expect.stringMatching(/^Not classed as toxic/u) as string }]);
  });

  it('notes a trace up to 1 µmol/mol (own choice)', () => {
    expect(judge({ 'carbon monoxide': 0.9e-6, nitrogen: 1 - 0.9e-6 })).toMatchObject([{ verdict: 'note' }]);
    expect(judge({ 'carbon monoxide': 1.1e-6, nitrogen: 1 - 1.1e-6 })).toMatchObject([{ verdict: 'caution' }]);
  });

  it('leaves out such a trace when it was not ordered', () => {
    const mix = { 'carbon monoxide': 0.9e-6, nitrogen: 1 - 0.9e-6 };
    expect(findingsOf(rule, planFixture({ parents: { gas: { mix } }, additions: [['gas', 100]], unordered: ['carbon monoxide'] }))).toEqual([]);
  });

  it('counts a harmful gas without an LC50 against the plan', () => {
    expect(judge({ benzene: 1e-5, nitrogen: 1 - 1e-5 })).toMatchObject([{ verdict: 'caution', figure: 'LC50 not known here' }]);
    expect(judge({ methanol: 1e-3, ammonia: 0.01, nitrogen: 0.989 })).toMatchObject([{ verdict: 'caution' }, { verdict: 'caution', figure: 'LC50 not known here' }]);
  });

  it('takes the lowest of figures that disagree: arsine 20, not 178 µmol/mol', () => {
    expect(judge({ arsine: 1e-4, nitrogen: 0.9999 })).toMatchObject([{ figure: 'LC50 200000 µmol/mol' }]);
  });

  it('has nothing to say of other gases', () => {
    expect(judge({ nitrogen: 1 })).toEqual([]);
  });
});
