import { describe, expect, it } from 'vitest';
import { suggestClassification } from '../../../../src/blending/hazards/classification/index.ts';
import type { Classification } from '../../../../src/blending/hazards/classification/index.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { Mix, PlanFixture } from '../../../fixtures/unchecked-plan.ts';
import type { UncheckedPlan } from '../../../../src/blending/plan/plan.ts';

/** 100 bar absolute of a mixture, exact unless a tolerance is given. */
const finished = (mix: Mix, more: Partial<PlanFixture> = {}, absolute = 100): UncheckedPlan => planFixture({
  parents: { gas: { mix } }, additions: [['gas', absolute]], tolerance: Object.fromEntries(Object.keys(mix).map((gas) => [gas, 0])), ...more,
});
const classOf = (mix: Mix, more: Partial<PlanFixture> = {}, absolute = 100): Classification => suggestClassification(finished(mix, more, absolute));

/** Class and number as planned, `2.1 UN 1954`; null when none is suggested. */
const transport = (mix: Mix, absolute = 100): string | null => {
  return classOf(mix, {}, absolute).planned.transport?.lines.map((line) => line.code).join(' ') ?? null;
};
const statements = (mix: Mix, absolute = 100): readonly string[] => classOf(mix, {}, absolute).planned.statements.map((line) => line.code);

describe('class in transport', () => {
  // UN numbers from memory, 3303 and 3304 seen in a public list; limits of ISO 10156 and UN 2.2.3.
  it.each<[string, Mix, string]>([
    ['inert', { 'carbon dioxide': 0.05, nitrogen: 0.95 }, '2.2 UN 1956'],
    ['a trace of carbon monoxide', { 'carbon monoxide': 50e-6, nitrogen: 1 - 50e-6 }, '2.2 UN 1956'],
    ['flammable', { methane: 0.1, nitrogen: 0.9 }, '2.1 UN 1954'],
    ['oxidising', { oxygen: 0.3, nitrogen: 0.7 }, '2.2 (5.1) UN 3156'],
    ['toxic', { phosphine: 0.005, nitrogen: 0.995 }, '2.3 UN 1955'],
    ['toxic and flammable', { 'carbon monoxide': 0.8, nitrogen: 0.2 }, '2.3 (2.1) UN 1953'],
    ['toxic and corrosive', { 'sulfur dioxide': 0.55, nitrogen: 0.45 }, '2.3 (8) UN 3308'],
    ['toxic, corrosive, little enough to be compressed gas', { 'hydrogen fluoride': 0.25, nitrogen: 0.75 }, '2.3 (8) UN 3304'],
    ['toxic, oxidising, corrosive', { chlorine: 0.3, oxygen: 0.2, nitrogen: 0.5 }, '2.3 (5.1, 8) UN 3306'],
    ['liquefied', { 'carbon dioxide': 0.6, nitrogen: 0.4 }, '2.2 UN 3163'],
    ['synthetic air', { oxygen: 0.209, nitrogen: 0.791 }, '2.2 UN 1002'],
    ['one gas', { nitrogen: 1 }, '2.2 UN 1066'],
    ['one toxic gas', { 'carbon monoxide': 1 }, '2.3 (2.1) UN 1016'],
  ])('%s', (_name, mix, expected) => {
    expect(transport(mix)).toBe(expected);
  });

  it('changes at each limit', () => {
    // Tci of methane 8.7 %, oxidising power 23.5 %, LC50 5000 µmol/mol (phosphine 20: 0.4 %).
    expect([transport({ methane: 0.0869, nitrogen: 0.9131 }), transport({ methane: 0.0871, nitrogen: 0.9129 })]).toEqual(['2.2 UN 1956', '2.1 UN 1954']);
    expect([transport({ oxygen: 0.2349, nitrogen: 0.7651 }), transport({ oxygen: 0.2351, nitrogen: 0.7649 })]).toEqual(['2.2 UN 1002', '2.2 (5.1) UN 3156']);
    expect([transport({ phosphine: 0.00399, nitrogen: 0.99601 }), transport({ phosphine: 0.00401, nitrogen: 0.99599 })]).toEqual(['2.2 UN 1956', '2.3 UN 1955']);
    expect([transport({ oxygen: 0.1949, nitrogen: 0.8051 }), transport({ oxygen: 0.1951, nitrogen: 0.8049 })]).toEqual(['2.2 UN 1956', '2.2 UN 1002']);
  });

  it('puts toxic before flammable before the rest, and names the gases that make the class', () => {
    const name = classOf({ 'hydrogen sulfide': 0.3, methane: 0.3, nitrogen: 0.4 }).planned.transport?.lines[1]?.text;
    expect(name).toBe('Compressed gas, toxic, flammable, not otherwise specified (hydrogen sulfide, nitrogen)');
    expect(classOf({ methane: 0.1, nitrogen: 0.9 }).planned.transport?.lines[1]?.text).toContain('(methane, nitrogen)');
  });

  it('is a suggestion, with source and trust on each line', () => {
    const { caveat, planned, worst } = classOf({ methane: 0.1, nitrogen: 0.9 });
    expect(caveat).toContain('decides');
    for (const suggested of [planned, worst]) {
      const lines = [...suggested.statements, ...suggested.precautions, ...suggested.remarks, ...(suggested.transport?.lines ?? [])];
      expect(lines.length).toBeGreaterThan(4);
      for (const line of lines) expect([line.text, line.source, line.trust].every((text) => text.length > 0), line.code).toBe(true);
    }
  });
});

describe('a gas that is hardly under pressure', () => {
  // GHS 2.5: 200 kPa gauge at 20 °C; the barometer of the fixture is 1 bar.
  it('is no gas under pressure below 200 kPa gauge at 20 °C, and then not subject when it has no other hazard', () => {
    expect(statements({ nitrogen: 1 }, 3.01)).toEqual(['H280']);
    expect(statements({ nitrogen: 1 }, 2.99)).toEqual([]);
    const [above, below] = [3.01, 2.99].map((absolute) => classOf({ nitrogen: 1 }, {}, absolute).planned);
    expect(above?.transport?.un).toBe(1066);
    expect(below).toMatchObject({ transport: null, notJudged: [], signalWord: null });
    expect(below?.remarks.map((line) => line.text).join(' ')).toMatch(/Not a gas under pressure.*United States rules count it/u);
  });

  it('keeps its class when it burns, oxidises or poisons; United States rules begin at 280 kPa absolute', () => {
    expect(transport({ methane: 0.1, nitrogen: 0.9 }, 2)).toBe('2.1 UN 1954');
    const remarks = classOf({ nitrogen: 1 }, {}, 2.79).planned.remarks.map((line) => line.text).join(' ');
    expect(remarks).not.toContain('United States');
  });
});

describe('statements of the Globally Harmonized System', () => {
  // CLP 2.2.2 as read: category 1B above 6 % lower limit; 2.4: 23.5 %; acute toxicity 100, 500, 2500, 20 000 µmol/mol from memory.
  it('H270 for oxidising gas, with its precautions', () => {
    expect(statements({ oxygen: 0.3, nitrogen: 0.7 })).toEqual(['H270', 'H280']);
    expect(classOf({ oxygen: 0.3, nitrogen: 0.7 }).planned.precautions.map((line) => line.code)).toEqual(['P220', 'P244', 'P410 + P403']);
    // Published: GHS chapter 2.4 example H10, oxidising power 20.1 (from memory).
    expect(statements({ oxygen: 0.09, 'nitrous oxide': 0.16, helium: 0.75 })).toEqual(['H280']);
  });

  it('H220 up to a lower limit of 6 % in air, H221 above, and for ammonia as the only fuel', () => {
    // Methane 4.4 % pure; in nitrogen the mixture’s own limit is about 4.4/x.
    expect(statements({ methane: 1 })).toEqual(['H220', 'H280']);
    expect(statements({ methane: 0.75, nitrogen: 0.25 })).toEqual(['H220', 'H280']);
    expect(statements({ methane: 0.7, nitrogen: 0.3 })).toEqual(['H221', 'H280']);
    expect(classOf({ methane: 0.7, nitrogen: 0.3 }).planned.signalWord).toBe('Warning');
    expect(classOf({ ammonia: 0.5, nitrogen: 0.5 }).planned.statements.map((line) => line.code)).toContain('H221');
    // Published: ISO 10156:2017 example H1 has a lower limit of 39.7 %: flammable, its range not known.
    const remarks = classOf({ hydrogen: 0.02, methane: 0.08, argon: 0.25, helium: 0.65 }).planned.remarks.map((line) => line.text).join(' ');
    expect(remarks).toContain('about 39.7 %');
  });

  it('H232 above 1 % of a gas that lights by itself', () => {
    expect(statements({ silane: 0.0101, nitrogen: 0.9899 })).toContain('H232');
    expect(statements({ silane: 0.0099, nitrogen: 0.9901 })).not.toContain('H232');
    // At worst within ±10 % there is 1.045 % of it.
    const { planned, worst } = classOf({ silane: 0.0095, nitrogen: 0.9905 }, { tolerance: { silane: 0.1 } });
    expect([planned, worst].map((each) => each.statements.some(({ code }) => code === 'H232'))).toEqual([false, true]);
  });

  it.each([[100, 'H330', 'H330'], [500, 'H330', 'H331'], [2500, 'H331', 'H332'], [20_000, 'H332', null]] as const)(
    'acute toxicity estimate of %d µmol/mol: %s up to it, then %s', (estimate, below, above) => {
      // Phosphine: LC50 (rat, 4 h) 11 µmol/mol, NIOSH.
      const acute = (value: number): string | undefined =>
        statements({ phosphine: 11 / value, nitrogen: 1 - 11 / value }).find((code) => code.startsWith('H33'));
      expect(acute(estimate * 0.999)).toBe(below);
      expect(acute(estimate * 1.001) ?? null).toBe(above);
    });

  it('takes half of the 1 h figure where none for 4 h is known: chlorine 293/2', () => {
    const remarks = classOf({ chlorine: 0.1, nitrogen: 0.9 }).planned.remarks.map((line) => line.text).join(' ');
    expect(remarks).toContain('2930 µmol/mol; acute toxicity estimate (4 h), which labels use: 1465 µmol/mol');
  });
});

describe('what cannot be judged', () => {
  it('says so for fuel and oxidiser together, and gives no class', () => {
    const { planned } = classOf({ methane: 0.025, oxygen: 0.205, nitrogen: 0.77 });
    expect(planned.transport).toBeNull();
    expect(planned.notJudged.join(' ')).toContain('57 % of its lower flammable limit');
    expect(transport({ methane: 0.0109, oxygen: 0.2, nitrogen: 0.7891 })).toBe('2.2 UN 1956');
    expect(transport({ methane: 0.0111, oxygen: 0.2, nitrogen: 0.7889 })).toBeNull();
  });

  it('counts a harmful gas without LC50 as the most toxic of the table before it gives up', () => {
    // 20 µmol/mol (phosphine, arsine) in 5000: 0.4 % of it could be toxic.
    expect(transport({ benzene: 0.0039, nitrogen: 0.9961 })).toBe('2.2 UN 1956');
    expect(transport({ benzene: 0.0041, nitrogen: 0.9959 })).toBeNull();
    expect(classOf({ benzene: 0.0041, nitrogen: 0.9959 }).planned.notJudged.join(' ')).toContain('benzene');
  });
});

describe('ammonia as the only fuel', () => {
  it('gets no class between 2.1 and 2.2, and its own when the mixture is toxic', () => {
    // LC50 of ammonia 4000 µmol/mol, from memory: toxic from 80 % on. Tci 40.1 %, from memory.
    expect(classOf({ ammonia: 0.41, nitrogen: 0.59 }).planned).toMatchObject({ transport: null, notJudged: [expect.stringContaining('cannot be told')] });
    expect(transport({ ammonia: 0.81, nitrogen: 0.19 })).toBe('2.3 (8) UN 3308');
    expect(transport({ ammonia: 0.01, nitrogen: 0.99 })).toBe('2.2 UN 1956');
  });
});

describe('planned and worst within the tolerance', () => {
  it('differ when only the high end crosses a limit', () => {
    const methane = (tolerance: number): Classification => classOf({ methane: 0.085, nitrogen: 0.915 }, { tolerance: { methane: tolerance } });
    expect(methane(0.02)).toMatchObject({ differs: false, worst: { transport: { un: 1956 } } });
    expect(methane(0.03)).toMatchObject({ differs: true, planned: { transport: { un: 1956 } }, worst: { transport: { un: 1954 } } });
  });

  it('uses the cautious coefficients only at worst: carbon monoxide 12 %, whose Tci of 15.2 % is from memory', () => {
    expect(classOf({ 'carbon monoxide': 0.12, nitrogen: 0.88 })).toMatchObject({
      differs: true, planned: { transport: { un: 1956 } }, worst: { transport: { un: 1954 } },
    });
  });
});
