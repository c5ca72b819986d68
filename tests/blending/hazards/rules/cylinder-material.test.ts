import { describe, expect, it } from 'vitest';
import { findingsOf, verdictsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { Mix } from '../../../fixtures/unchecked-plan.ts';
import type { UncheckedPlan } from '../../../../src/blending/plan/plan.ts';
import type { CylinderMaterial } from '../../../../src/blending/recipe/document.ts';

const rule = 'cylinder-material';
const filled = (mix: Mix, material: CylinderMaterial): UncheckedPlan =>
  planFixture({ parents: { gas: { mix } }, additions: [['gas', 100]], cylinder: { material } });
const sour: Mix = { 'carbon monoxide': 0.01, 'hydrogen sulfide': 0.01, nitrogen: 0.98 };

// Common practice, no source; to be checked against ISO 11114-1 and -4.
describe(rule, () => {
  it('cautions carbon monoxide and hydrogen sulfide in steel, not in aluminium', () => {
    expect(verdictsOf(rule, filled(sour, 'steel'))).toEqual({
      [`${rule}:cylinder:carbon-monoxide`]: 'caution', [`${rule}:cylinder:hydrogen-sulfide`]: 'caution',
    });
    expect(verdictsOf(rule, filled(sour, 'aluminium'))).toEqual({});
  });

  it('judges a cylinder of unknown material as steel and says so', () => {
    expect(findingsOf(rule, filled(sour, 'rigid'))[0]?.detail).toContain('material is not stated');
  });

  it('notes hydrogen in steel, and cautions above 50 bar partial pressure', () => {
    expect(verdictsOf(rule, filled({ hydrogen: 0.49, nitrogen: 0.51 }, 'steel'))).toEqual({ [`${rule}:cylinder:hydrogen`]: 'note' });
    expect(verdictsOf(rule, filled({ hydrogen: 0.51, nitrogen: 0.49 }, 'steel'))).toEqual({ [`${rule}:cylinder:hydrogen`]: 'caution' });
    expect(findingsOf(rule, filled({ hydrogen: 0.51, nitrogen: 0.49 }, 'steel'))[0]?.figure).toBe('51.0 bar absolute');
  });

  it('leaves out impurities up to 1 µmol/mol', () => {
    expect(verdictsOf(rule, filled({ 'carbon monoxide': 0.9e-6, hydrogen: 0.9e-6, nitrogen: 1 - 1.8e-6 }, 'steel'))).toEqual({});
  });
});
