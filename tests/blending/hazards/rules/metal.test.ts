import { describe, expect, it } from 'vitest';
import { findingsOf, verdictsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { Mix } from '../../../fixtures/unchecked-plan.ts';
import { metalRow } from '../../../../src/blending/hazards/data/metals.ts';
import type { UncheckedPlan } from '../../../../src/blending/plan/plan.ts';
import type { CylinderMaterial } from '../../../../src/blending/recipe/document.ts';
import { gasIds } from '../../../../src/thermo/index.ts';
import type { GasId } from '../../../../src/thermo/index.ts';

const filled = (mix: Mix, material: CylinderMaterial, unordered: readonly GasId[] = []): UncheckedPlan =>
  planFixture({ parents: { gas: { mix } }, additions: [['gas', 100]], cylinder: { material }, unordered });
const content = (gas: GasId, fraction = 0.01): Mix => ({ [gas]: fraction, nitrogen: 1 - fraction });

// Common practice, no source; to be checked against ISO 11114-1.
describe('material', () => {
  const rule = 'material';

  it('knows every gas of the program', () => {
    for (const gas of gasIds) expect(metalRow(gas)?.gas, gas).toBe(gas);
  });

  it.each(['hydrogen chloride', 'hydrogen fluoride', 'chlorine'] as const)('holds %s in aluminium, and wants it dry in steel', (gas) => {
    expect(verdictsOf(rule, filled(content(gas), 'aluminium'))).toEqual({ [`${rule}:cylinder:${gas.replace(' ', '-')}`]: 'hold' });
    expect(verdictsOf(rule, filled(content(gas), 'steel'))).toEqual({ [`${rule}:cylinder:dry`]: 'note' });
  });

  it('judges a cylinder of unknown material as the worse of the two and says so', () => {
    expect(findingsOf(rule, filled(content('hydrogen chloride'), 'rigid'))).toMatchObject([{ verdict: 'hold', limit: 'not in aluminium' }]);
    const [nitrogenDioxide] = findingsOf(rule, filled(content('nitrogen dioxide'), 'rigid'));
    expect(nitrogenDioxide).toMatchObject({ verdict: 'caution', title: expect.stringContaining('In steel with care') as string });
    expect(nitrogenDioxide?.detail).toContain('The material is not stated');
  });

  it('does not repeat what cylinder-material says of steel', () => {
    const mix: Mix = { 'carbon monoxide': 0.01, 'hydrogen sulfide': 0.01, hydrogen: 0.6, nitrogen: 0.38 };
    expect(findingsOf(rule, filled(mix, 'steel'))).toEqual([]);
    expect(findingsOf(rule, filled(mix, 'aluminium'))).toEqual([]);
  });

  it('judges deuterium in steel by 50 bar partial pressure, as hydrogen', () => {
    expect(findingsOf(rule, filled(content('deuterium', 0.49), 'steel'))).toMatchObject([{ verdict: 'note' }]);
    expect(findingsOf(rule, filled(content('deuterium', 0.51), 'steel'))).toMatchObject([{ verdict: 'caution', figure: '51.0 bar absolute' }]);
    expect(findingsOf(rule, filled(content('deuterium', 0.51), 'aluminium'))).toEqual([]);
  });

  it('lists gases that only have to be dry in one note', () => {
    expect(findingsOf(rule, filled({ 'sulfur dioxide': 0.01, 'carbon dioxide': 0.05, nitrogen: 0.94 }, 'steel'))).toMatchObject([
      { verdict: 'note', figure: expect.stringMatching(/sulfur dioxide.*carbon dioxide/u) as string },
    ]);
  });

  it('leaves out what was not ordered up to 10 µmol/mol (own choice)', () => {
    expect(findingsOf(rule, filled(content('water', 9e-6), 'steel', ['water']))).toEqual([]);
    expect(findingsOf(rule, filled(content('water', 11e-6), 'steel', ['water']))).toHaveLength(1);
    expect(findingsOf(rule, filled(content('water', 9e-6), 'steel'))).toHaveLength(1);
  });
});

describe('valve-and-fittings', () => {
  const rule = 'valve-and-fittings';

  it.each(['ammonia', 'acetylene', 'nitric oxide', 'nitrogen dioxide', 'methyl mercaptan', 'hydrogen chloride'] as const)('cautions brass and copper for %s', (gas) => {
    expect(verdictsOf(rule, filled(content(gas), 'aluminium'))).toMatchObject({ [`${rule}:cylinder:brass`]: 'caution' });
  });

  it('notes what is to be watched, and says nothing of nitrogen and methane', () => {
    expect(verdictsOf(rule, filled(content('hydrogen sulfide'), 'aluminium'))).toEqual({ [`${rule}:cylinder:care`]: 'note' });
    expect(verdictsOf(rule, filled(content('hydrogen fluoride'), 'steel'))).toEqual({ [`${rule}:cylinder:care`]: 'note' });
    expect(findingsOf(rule, filled(content('methane'), 'aluminium'))).toEqual([]);
  });
});
