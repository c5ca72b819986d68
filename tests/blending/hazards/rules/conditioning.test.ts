import { describe, expect, it } from 'vitest';
import { planRecipe } from '../../../../src/blending/index.ts';
import type { Batch, ConditioningStep, Contents, Cylinder, Parent, Plan } from '../../../../src/blending/index.ts';
import { pure, recipeOf, residual, valueOf } from '../../lab.ts';
import type { Line, Supply } from '../../lab.ts';

type Purge = Extract<ConditioningStep, { kind: 'purge' }>;
const absolute = (typed: string) => ({ typed, reference: 'absolute' } as const);
const purge = (parent: string, more: Partial<Purge> = {}): Purge => ({
  kind: 'purge', parent, low: absolute('1.1 bar'), high: absolute('5 bar'), cycles: '4', wanted: '', ...more,
});

interface Case {
  readonly contents: Contents;
  readonly acts: readonly ConditioningStep[];
  readonly supplies?: readonly Supply[];
  readonly cylinder?: Partial<Cylinder>;
  readonly batch?: Partial<Batch>;
  readonly parents?: Readonly<Record<string, Partial<Parent>>>;
}

/** Nitrogen to 50 bar absolute after the conditioning, in a 10 L cylinder. */
function planOf({ contents, acts, supplies = [], cylinder = {}, batch = {}, parents = {} }: Case): Plan {
  const recipe = recipeOf({ order: [['N2', '100 %']], to: '50 bar', parents: [pure('N2', '200 bar'), ...supplies] });
  return valueOf(planRecipe({
    ...recipe, conditioning: acts, batch: { ...recipe.batch, ...batch },
    cylinder: { ...recipe.cylinder, contents, ...cylinder },
    parents: recipe.parents.map((parent) => ({ ...parent, ...parents[parent.key] })),
  }));
}

/** Verdict and what the finding is about, of one rule. */
function findingsOf(rule: string, said: Case): readonly string[] {
  return planOf(said).findings.filter((each) => each.rule === rule).map(({ id, verdict }) => `${verdict} ${id.slice(rule.length + 1)}`);
}

const left = (...lines: readonly Line[]): Contents => residual('2 bar', lines);
const air: Supply = { key: 'air', lines: [['O2', '21 %'], ['N2', '79 %']], pressure: '200 bar' };
const empty = recipeOf({ order: [['N2', '100 %']], to: '50 bar' }).cylinder.contents;
/** Purges until nothing of the old gas bends the order. */
const thorough = { low: absolute('0.1 mbar'), cycles: '3' };

describe('conditioning-fuel-and-oxidiser', () => {
  const rule = 'conditioning-fuel-and-oxidiser';
  // Afterwards nitrogen takes all of it out again, so no rule on the fill itself has a word to say.
  const clean = purge('N2', { low: absolute('0.1 mbar'), cycles: '6' });

  it('holds air let into methane: 2 bar are let out to 1.1 bar, then 5/1.1 is 22 % methane in 16 % oxygen', () => {
    const said = { contents: left(['CH4', '100 %']), acts: [purge('air'), clean], supplies: [air] };
    expect(findingsOf(rule, said).slice(0, 2)).toEqual(['hold cylinder:act-1-boundary', 'hold cylinder:act-1-mixed']);
    const { findings } = planOf(said);
    expect(findings.filter(({ rule: each }) => each === 'fuel-meets-oxidiser' || each === 'fuel-with-oxidiser').map(({ verdict }) => verdict)).not.toContain('hold');
  });

  it('is silent for nitrogen into methane and for air into nitrogen', () => {
    expect(findingsOf(rule, { contents: left(['CH4', '100 %']), acts: [clean] })).toEqual([]);
    expect(findingsOf(rule, { contents: left(['N2', '100 %']), acts: [purge('air'), clean], supplies: [air] })).toEqual([]);
  });

  it('makes a note of a trace: 50 mbar absolute of flammable mixture are 2.2 mbar of methane (lower limit 4.4 %, IEC 60079-20-1)', () => {
    const traced = (low: string): readonly string[] =>
      findingsOf(rule, { contents: left(['CH4', '100 %']), acts: [purge('air', { low: absolute(low) }), clean], supplies: [air] })
        .filter((each) => each.endsWith('act-1-boundary'));
    expect(traced('2.1 mbar')).toEqual(['note cylinder:act-1-boundary']);
    expect(traced('2.3 mbar')).toEqual(['hold cylinder:act-1-boundary']);
    // Where less is in than the purge goes down to, that is what the purge gas meets.
    const little = (bar: string): readonly string[] => findingsOf(rule, { contents: residual(bar, [['CH4', '100 %']]), acts: [purge('air'), clean], supplies: [air] });
    expect(little('2.1 mbar')[0]).toBe('note cylinder:act-1-boundary');
    expect(little('2.3 mbar')[0]).toBe('hold cylinder:act-1-boundary');
  });

  it('judges what is found, which the first addition does not see any more', () => {
    // 8 % methane in air: published flammable range 4.4 to 17 %.
    const found = left(['CH4', '8 %'], ['O2', '19.3 %'], ['N2', '72.7 %']);
    expect(findingsOf(rule, { contents: found, acts: [clean] })).toContain('hold cylinder:found');
    expect(findingsOf(rule, { contents: left(['CH4', '8 %'], ['N2', '92 %']), acts: [clean] })).toEqual([]);
  });
});

describe('conditioning-incompatible-pair', () => {
  const rule = 'conditioning-incompatible-pair';
  const ammonia: Supply = { key: 'NH3', lines: [['NH3', '1 %'], ['N2', '99 %']], pressure: '50 bar' };
  const acts = [purge('NH3', { high: absolute('3 bar'), cycles: '1' }), purge('N2', thorough)];

  it('holds ammonia let into what is left of hydrogen chloride (trade knowledge: solid salt), not into nitrogen', () => {
    expect(findingsOf(rule, { contents: left(['HCl', '1 %'], ['N2', '99 %']), acts, supplies: [ammonia] })).toEqual(['hold cylinder:act-1-hydrogen-chloride-ammonia']);
    expect(findingsOf(rule, { contents: left(['N2', '100 %']), acts, supplies: [ammonia] })).toEqual([]);
  });

  it('leaves out what is not more than an impurity', () => {
    expect(findingsOf(rule, { contents: left(['HCl', '0.09 %'], ['N2', 'balance']), acts, supplies: [ammonia] })).toEqual([]);
    expect(findingsOf(rule, { contents: left(['HCl', '0.11 %'], ['N2', 'balance']), acts, supplies: [ammonia] })).toHaveLength(1);
  });
});

describe('conditioning-pressure', () => {
  const rule = 'conditioning-pressure';
  const high = (bar: string, cylinder: Partial<Cylinder>, temperature = '15 °C'): readonly string[] => findingsOf(rule, {
    contents: residual('2 bar', [['N2', '100 %']], temperature), acts: [purge('N2', { high: absolute(bar), cycles: '1' })],
    cylinder: { ...cylinder, contents: residual('2 bar', [['N2', '100 %']], temperature) },
  });
  const marked = { workingPressure: absolute('100 bar'), testPressure: absolute('150 bar') };

  it('holds above the working pressure, and not at it', () => {
    expect(high('100 bar', marked)).toEqual([]);
    expect(high('101 bar', marked)).toEqual(['hold cylinder:act-1']);
  });

  it('cautions where only warm gas reads above the mark: 101 bar at 30 °C are 95 bar at 15 °C', () => {
    expect(high('101 bar', marked, '30 °C')).toEqual(['caution cylinder:act-1']);
    expect(high('110 bar', marked, '30 °C')).toEqual(['hold cylinder:act-1']);
  });

  it('holds above the test pressure where no working pressure is stated', () => {
    const unmarked = { workingPressure: absolute(''), testPressure: absolute('150 bar') };
    expect(high('149 bar', unmarked)).toEqual([]);
    expect(high('151 bar', unmarked)).toEqual(['hold cylinder:act-1']);
  });
});

describe('conditioning-supply', () => {
  const rule = 'conditioning-supply';
  const purging = (pressure: string, batch: Partial<Batch> = {}): readonly string[] => findingsOf(rule, {
    contents: left(['N2', '100 %']), acts: [purge('Ar', { high: absolute('50 bar') }), purge('N2', thorough)], supplies: [pure('Ar', pressure)], batch,
  });

  it('holds a purge gas below the 50 bar up to which it purges, cautions within 5 % and where nothing is stated', () => {
    expect(purging('49 bar')).toEqual(['hold parent-Ar:act-1']);
    expect(purging('52 bar')).toEqual(['caution parent-Ar:act-1']);
    expect(purging('53 bar')).toEqual([]);
    expect(purging('')).toEqual(['caution parent-Ar:act-1']);
  });

  it('asks for the inlet of a booster where there is one', () => {
    const booster = { boosterInlet: absolute('10 bar') };
    expect(purging('13 bar', booster)).toEqual([]);
    expect(purging('9 bar', booster)).toEqual(['hold parent-Ar:act-1']);
  });
});

describe('conditioning-level', () => {
  const rule = 'conditioning-level';
  const level = (wanted: string): readonly string[] => findingsOf(rule, { contents: left(['Ar', '1 %'], ['N2', 'balance']), acts: [purge('N2', { cycles: '3', wanted })] });

  it('says where typed cycles miss the level: three from 5 to 1.1 bar leave 1.06 % by the rule', () => {
    expect(level('1 %')).toEqual(['caution cylinder:act-1']);
    expect(level('1.2 %')).toEqual([]);
    expect(level('')).toEqual([]);
  });
});

describe('conditioning-line', () => {
  const rule = 'conditioning-line';
  const oxygen = pure('O2', '200 bar');
  const with10 = (supply: Supply, contents: Contents = empty): readonly string[] => findingsOf(rule, {
    contents, acts: [purge('O2', thorough), purge(supply.key, thorough), purge('N2', thorough)], supplies: [oxygen, supply],
  });

  it('cautions fuel and enriched gas through one line, one of them to purge; a note for the enriched one alone', () => {
    expect(with10(pure('Ar', '200 bar'))).toEqual(['note parent-O2']);
    expect(with10({ key: 'CH4', lines: [['CH4', '100 %']], pressure: '200 bar' })).toEqual(['caution parent-O2', 'caution parent-CH4']);
    expect(with10({ key: 'lean', lines: [['CH4', '1 %'], ['N2', 'balance']], pressure: '200 bar' })).toEqual(['note parent-O2']);
  });
});

describe('parents that only purge', () => {
  it('are asked for their purity and their oxygen like those that are added', () => {
    const { findings } = planOf({ contents: empty, acts: [purge('O2', thorough), purge('N2', thorough)], supplies: [pure('O2', '200 bar')] });
    const about = findings.filter(({ place }) => place.kind === 'parent' && place.parent === 'O2').map(({ rule }) => rule);
    expect(about).toEqual(expect.arrayContaining(['oxygen-enriched', 'oxygen-compression-heat', 'purity-not-stated']));
    expect(about).not.toContain('supply-pressure');
  });

  it('are left out where they purge for no cycle', () => {
    const enough = purge('O2', { cycles: '', wanted: '5 %' });
    const { conditioned, findings } = planOf({ contents: left(['N2', '100 %']), acts: [purge('N2'), enough], supplies: [pure('O2', '20 bar')], batch: { cylinders: '3' } });
    expect(conditioned[1]).toMatchObject({ cycles: 0, purgeGas: 0 });
    expect(findings.filter(({ place }) => place.kind === 'parent' && place.parent === 'O2')).toEqual([]);
  });
});
