import { describe, expect, it } from 'vitest';
import { cubicMetre } from '../../../../src/units/index.ts';
import { findingsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { Mix } from '../../../fixtures/unchecked-plan.ts';

/** `released` m³ of a gas into a room of `room` m³. */
const judge = (rule: string, mix: Mix, released: number, room: number | null): unknown => {
  const plan = planFixture({ parents: { gas: { mix } }, additions: [['gas', 100]], conditions: { roomVolume: room === null ? null : cubicMetre(room) } });
  return findingsOf(rule, { ...plan, final: { ...plan.final, releasedVolume: cubicMetre(released) } });
};

describe('room-oxygen', () => {
  const rule = 'room-oxygen';

  // Room numbers computed with the full-mixing estimate; limits 29 CFR 1910.146.
  it('10 L of nitrogen at 150 bar (1.45 m³) in 30 m³: 19.9 %, a note', () => {
    expect(judge(rule, { nitrogen: 1 }, 1.45, 30)).toMatchObject([{ verdict: 'note', figure: '19.9 %' }]);
  });

  it('50 L at 200 bar (9.9 m³) in 30 m³: 14.0 %, below 18 % too', () => {
    expect(judge(rule, { nitrogen: 1 }, 9.9, 30)).toMatchObject([{ verdict: 'caution', figure: '14.0 %', limit: 'not below 19.5 % (18 % in some countries)' }]);
  });

  it('changes at 19.5 %, 18 % and 23.5 %', () => {
    // 20.9 (1 − s) = 19.5 at s = 0.06699, = 18 at s = 0.1388; oxygen: 20.9 + 79.1 s = 23.5 at s = 0.03287.
    expect(judge(rule, { nitrogen: 1 }, 0.0669, 1)).toMatchObject([{ verdict: 'note' }]);
    expect(judge(rule, { nitrogen: 1 }, 0.0671, 1)).toMatchObject([{ verdict: 'caution', limit: 'not below 19.5 %' }]);
    expect(judge(rule, { nitrogen: 1 }, 0.1386, 1)).toMatchObject([{ limit: 'not below 19.5 %' }]);
    expect(judge(rule, { nitrogen: 1 }, 0.139, 1)).toMatchObject([{ limit: 'not below 19.5 % (18 % in some countries)' }]);
    expect(judge(rule, { oxygen: 1 }, 0.0328, 1)).toMatchObject([{ verdict: 'note' }]);
    expect(judge(rule, { oxygen: 1 }, 0.033, 1)).toMatchObject([{ verdict: 'caution', limit: 'not above 23.5 %' }]);
  });

  it('counts the oxygen that the gas brings itself', () => {
    expect(judge(rule, { oxygen: 0.209, nitrogen: 0.791 }, 10, 30)).toMatchObject([{ verdict: 'note', figure: '20.9 %' }]);
  });

  it('counts against the plan when the room is not stated', () => {
    expect(judge(rule, { nitrogen: 1 }, 1, null)).toMatchObject([{ verdict: 'caution', figure: 'not computed', limit: 'not stated' }]);
  });
});

describe('room-flammable', () => {
  const rule = 'room-flammable';

  it('cautions above 10 % of the lower flammable limit (29 CFR 1910.146): methane 0.44 % in air', () => {
    expect(judge(rule, { methane: 1 }, 0.0045, 1)).toMatchObject([{ verdict: 'caution', figure: '10.2 % of the lower flammable limit' }]);
    expect(judge(rule, { methane: 1 }, 0.0043, 1)).toEqual([]);
  });

  it('has nothing to say without fuel or without a room', () => {
    expect(judge(rule, { nitrogen: 1 }, 10, 30)).toEqual([]);
    expect(judge(rule, { methane: 1 }, 10, null)).toEqual([]);
  });
});
