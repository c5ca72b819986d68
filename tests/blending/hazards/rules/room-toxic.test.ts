import { describe, expect, it } from 'vitest';
import { cubicMetre } from '../../../../src/units/index.ts';
import { findingsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';
import { idlhOf } from '../../../../src/blending/hazards/data/dangerous-room-air.ts';
import type { GasId } from '../../../../src/thermo/index.ts';

const rule = 'room-toxic';

/** A gas in nitrogen, without tolerance, of which a share of the room's air consists after it emptied. */
const judge = (gas: GasId, content: number, share: number | null, { tolerance = 0, ordered = true } = {}): ReturnType<typeof findingsOf> => {
  const plan = planFixture({
    parents: { gas: { mix: { [gas]: content, nitrogen: 1 - content } } }, additions: [['gas', 100]], balance: 'nitrogen',
    tolerance: { [gas]: tolerance }, unordered: ordered ? [] : [gas], conditions: { roomVolume: share === null ? null : cubicMetre(1 / share) },
  });
  return findingsOf(rule, { ...plan, final: { ...plan.final, releasedVolume: cubicMetre(1) } });
};

describe(rule, () => {
  // NIOSH IDLH as quoted: CO 1200, NO 100, NO₂ 13, Cl₂ 10, NH₃ 300, HCl 45, PH₃ 50, AsH₃ 3; from memory: H₂S 100, SO₂ 100.
  it.each([
    ['carbon monoxide', 1200], ['hydrogen sulfide', 100], ['sulfur dioxide', 100], ['methyl mercaptan', 150], ['nitric oxide', 100],
    ['nitrogen dioxide', 13], ['ammonia', 300], ['hydrogen chloride', 45], ['hydrogen fluoride', 30], ['hydrogen cyanide', 50],
    ['chlorine', 10], ['phosphine', 50], ['arsine', 3], ['ethylene oxide', 800],
  ] as const)('%s: a caution above %d µmol/mol in the room, a note up to it', (gas, idlh) => {
    expect(idlhOf(gas)?.value).toBe(idlh);
    expect(judge(gas, idlh * 1e-5 * 1.001, 0.1)).toMatchObject([{ verdict: 'caution', place: { kind: 'room' } }]);
    expect(judge(gas, idlh * 1e-5 * 0.999, 0.1)).toMatchObject([{ verdict: 'note' }]);
  });

  it('takes 1 % of the LC50 where there is no IDLH (own choice): carbonyl sulfide 17 µmol/mol', () => {
    expect(judge('carbonyl sulfide', 171e-6, 0.1)).toMatchObject([{ verdict: 'caution', trust: 'common practice, no source' }]);
    expect(judge('carbonyl sulfide', 169e-6, 0.1)).toMatchObject([{ verdict: 'note' }]);
  });

  it('counts the most within the tolerance', () => {
    expect(judge('chlorine', 96e-6, 0.1, { tolerance: 0.05 })).toMatchObject([{ verdict: 'caution' }]);
    expect(judge('chlorine', 96e-6, 0.1, { tolerance: 0.04 })).toMatchObject([{ verdict: 'note' }]);
  });

  it('counts against the plan when the room is not stated or no figure is known', () => {
    expect(judge('chlorine', 1e-5, null)).toMatchObject([{ verdict: 'caution', figure: 'not computed', limit: 'not stated' }]);
    expect(judge('benzene', 1e-5, 0.1)).toMatchObject([{ verdict: 'caution', figure: 'not computed' }]);
  });

  it('leaves out an impurity up to 1 µmol/mol, and gases that are not toxic', () => {
    expect(judge('carbon monoxide', 0.9e-6, 0.1, { ordered: false })).toEqual([]);
    expect(judge('carbon monoxide', 1.1e-6, 0.1, { ordered: false })).toHaveLength(1);
    expect(judge('methane', 0.02, 0.1)).toEqual([]);
  });
});
