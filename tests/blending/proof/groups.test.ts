import { describe, expect, it } from 'vitest';
import { proofGroups } from '../../../src/blending/proof/index.ts';
import { runProof } from '../../../src/blending/proof/run.ts';
import { pureGasRows } from '../../../src/blending/proof/data/pure-gases.ts';
import { saturationRows } from '../../../src/blending/proof/data/saturation.ts';
import { virialRows } from '../../../src/blending/proof/data/second-virials.ts';
import { gasOf } from '../../../src/blending/proof/making.ts';
import { kunzWagnerPairs } from './kunz-wagner-pairs.ts';

const groups = proofGroups();
const cases = groups.flatMap((group) => group.cases);

describe('the proof', () => {
  it('has every case within its tolerance', () => {
    const outside = [...runProof(groups)].filter(({ within }) => !within);
    expect(outside.map(({ id, published, computed, reason }) => ({ id, published, computed, reason }))).toEqual([]);
  });

  it('holds the groups that the report promises, in order', () => {
    expect(groups.map(({ id }) => id)).toEqual([
      'gerg-point', 'gerg-binaries', 'gerg-states', 'pure-gases', 'long-equations', 'air', 'second-virials',
      'vapour-pressures', 'dew-points', 'worked-plans', 'weighing', 'classification', 'monte-carlo',
    ]);
    expect(cases.length).toBeGreaterThanOrEqual(690);
  });

  it('has one point of each of the 210 pairs of GERG-2008', () => {
    const ids = groups.find(({ id }) => id === 'gerg-binaries')!.cases.map(({ id }) => id.replace('gerg-binaries:', '').split('+').sort().join('+'));
    expect(new Set(ids)).toEqual(new Set(kunzWagnerPairs));
    expect(ids).toHaveLength(210);
  });

  it('leaves out no row of its data because a gas is not known', () => {
    const names = [...pureGasRows, ...virialRows, ...saturationRows].map(({ gas }) => gas);
    expect(names.filter((name) => gasOf(name) === null)).toEqual([]);
  });

  it('says of each case what it needs to be judged', () => {
    expect(new Set(cases.map(({ id }) => id)).size).toBe(cases.length);
    for (const { id, group, title, source, published, tolerance } of cases) {
      expect(groups.map((each) => each.id), id).toContain(group);
      expect(title.length, id).toBeGreaterThan(5);
      expect(source.length, id).toBeGreaterThan(5);
      expect(Number.isFinite(published), id).toBe(true);
      expect(tolerance.value, id).toBeGreaterThan(0);
      // A tolerance as wide as the value would prove nothing. Second virial coefficients go through zero, so theirs is in cm³/mol.
      if (group === 'second-virials') continue;
      const width = tolerance.kind === 'relative' ? tolerance.value : tolerance.value / Math.abs(published);
      expect(width, id).toBeLessThan(0.3);
    }
    for (const { id, why } of groups) expect(why.length, id).toBeGreaterThan(20);
  });
});
