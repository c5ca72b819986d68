import { describe, expect, it } from 'vitest';
import { judgeMarked } from '../../../../src/blending/hazards/replaced-values.ts';
import { fuelWithOxidiser } from '../../../../src/blending/hazards/rules/fuel-with-oxidiser.ts';
import { laboratoryValues } from '../../../../src/blending/hazards/rules/laboratory-values.ts';
import { toxicGas } from '../../../../src/blending/hazards/rules/toxic-gas.ts';
import { workingPressure } from '../../../../src/blending/hazards/rules/working-pressure.ts';
import type { Finding, HazardRule } from '../../../../src/blending/hazards/index.ts';
import { planFixture, toolsFixture } from '../../../fixtures/unchecked-plan.ts';

const rule = 'laboratory-values';
const fill = planFixture({
  parents: { methane: { mix: { methane: 1 } }, air: { mix: { nitrogen: 0.79, oxygen: 0.21 } } }, additions: [['methane', 1], ['air', 99]], tolerance: { methane: 0.01 },
});
const judge = (judged: HazardRule, values: Readonly<Record<string, number>>, plan = fill): readonly Finding[] => {
  const own = new Map(Object.entries(values).map(([id, value]) => [id, { value, source: 'own copy of the standard', date: '2026-11-30' }]));
  const withOwn = { ...plan, job: { ...plan.job, values: own } };
  return judgeMarked(judged, { plan: withOwn, tools: toolsFixture(withOwn) });
};

describe(rule, () => {
  it('says nothing while nothing is replaced', () => {
    expect(judge(laboratoryValues, {})).toEqual([]);
  });

  it('lists what was published, what stands for it, its source and its date', () => {
    const [note, ...others] = judge(laboratoryValues, { 'lfl:methane': 5, 'hold-fuel-share': 0.2, 'lc50:benzene': 13_700 });
    expect(others).toEqual([]);
    expect(note).toMatchObject({ id: `${rule}:finished-gas`, verdict: 'note', figure: '3 replaced', replaced: [] });
    expect(note?.detail).toContain('Lower flammable limit in air, methane: 4.4 % → 5 % (own copy of the standard, 2026-11-30)');
    expect(note?.detail).toContain('fuel with oxidiser is held: 0.25 → 0.2 (');
    expect(note?.detail).toContain('LC50, rat, 1 h, benzene: none published → 13700 µmol/mol');
  });

  it('cautions a value that no check knows, and still lists the others', () => {
    const findings = judge(laboratoryValues, { 'lfl:methan': 5, 'lfl:ethane': 2.7 });
    expect(findings.map(({ id, verdict }) => [id, verdict])).toEqual([[`${rule}:finished-gas`, 'note'], [`${rule}:finished-gas:unknown`, 'caution']]);
    expect(findings[1]?.title).toContain('lfl:methan');
  });
});

describe('findings judged with own values', () => {
  // Computed: 1.01 % of methane at worst is 23 % of the published lower limit of 4.4 % (IEC 60079-20-1), and 25 % of one of 4.04 %.
  it('change their verdict on the two sides of a threshold, and are marked', () => {
    const judged = (values: Readonly<Record<string, number>>): unknown => judge(fuelWithOxidiser, values).map(({ verdict, replaced }) => [verdict, replaced]);
    expect(judged({})).toEqual([['caution', []]]);
    expect(judged({ 'lfl:methane': 4.05 })).toEqual([['caution', ['lfl:methane']]]);
    expect(judged({ 'lfl:methane': 4.03 })).toEqual([['hold', ['lfl:methane']]]);
    expect(judged({ 'hold-fuel-share': 0.23, 'lfl:methane': 4.4 })).toEqual([['caution', ['lfl:methane', 'hold-fuel-share']]]);
    expect(judged({ 'hold-fuel-share': 0.229 })).toEqual([['hold', ['hold-fuel-share']]]);
  });

  it('name the laboratory’s own value in their source', () => {
    const [finding] = judge(fuelWithOxidiser, { 'lfl:methane': 3.6 });
    expect(finding?.source).toMatch(/ASTM E2079-19.*; laboratory’s own value: lfl:methane 3\.6 \(own copy of the standard, 2026-11-30\)$/u);
  });

  it('say in their limit what was judged with', () => {
    expect(judge(fuelWithOxidiser, { 'hold-fuel-share': 0.225 })[0]?.limit).toContain('fuel 22.5 % of its lower flammable limit');
  });

  it('are not marked where the rule did not ask for the value', () => {
    expect(judge(workingPressure, { 'lfl:methane': 3.6, 'lc50:chlorine': 200 }).every(({ replaced }) => replaced.length === 0)).toBe(true);
  });

  it('use an own LC50 for a gas that has none published', () => {
    const benzene = planFixture({ parents: { gas: { mix: { benzene: 0.001, nitrogen: 0.999 } } }, additions: [['gas', 100]] });
    expect(judge(toxicGas, {}, benzene)).toMatchObject([{ figure: 'LC50 not known here', verdict: 'caution' }]);
    // Computed: 13 700 µmol/mol over a content of 1/1000, above 1 mol/mol.
    expect(judge(toxicGas, { 'lc50:benzene': 13_700 }, benzene)).toMatchObject([{ figure: 'LC50 above 1 000 000 µmol/mol', replaced: ['lc50:benzene'] }]);
  });
});
