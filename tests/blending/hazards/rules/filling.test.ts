import { describe, expect, it } from 'vitest';
import { fail } from '../../../../src/units/index.ts';
import { findingsOf, verdictsOf } from '../../../fixtures/judge.ts';
import { bar, planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { Mix, PlanFixture } from '../../../fixtures/unchecked-plan.ts';
import { fillingDensities, fillingRatioOfMixture, fillingRatios } from '../../../../src/blending/hazards/data/filling-limits.ts';
import type { UncheckedPlan } from '../../../../src/blending/plan/plan.ts';
import type { GasId } from '../../../../src/thermo/index.ts';

/** A cylinder full of one gas, or mixture, with a filling ratio (kg/kg). The barometer is 1 bar. */
const holding = (mix: Mix, fillingRatio: number, cylinder: PlanFixture['cylinder'] = {}): UncheckedPlan => {
  const plan = planFixture({ parents: { gas: { mix } }, additions: [['gas', 50]], cylinder });
  return { ...plan, final: { ...plan.final, fillingRatio } };
};
const psi = (gauge: number): ReturnType<typeof bar> => bar((gauge * 6894.757293168) / 1e5 + 1);

describe('filling-density', () => {
  const rule = 'filling-density';
  const cases = fillingDensities.map(({ gas, from, limit }) => [gas, from, limit.value] as const);

  // 49 CFR 173.304a(a)(2): percentages as read in a public copy; service pressures of some rows from memory.
  it.each(cases)('%s from %d psi gauge on: %d %% of the water capacity, held above', (gas, from, percent) => {
    const marked = { workingPressure: psi(from) };
    const mix: Mix = { [gas as GasId]: 1 };
    expect(findingsOf(rule, holding(mix, percent * 1.0001e-2, marked))).toMatchObject([{ verdict: 'hold', limit: `${percent} %` }]);
    expect(findingsOf(rule, holding(mix, percent * 0.9999e-2, marked))).toMatchObject([{ verdict: 'note', limit: `${percent} %` }]);
  });

  it('published: ammonia 54, carbon dioxide 68 and 74.5, chlorine 125 % (49 CFR 173.304a, as read in a public copy)', () => {
    const most = (gas: string, at: number): number | undefined => cases.find((each) => each[0] === gas && each[1] === at)?.[2];
    expect([most('ammonia', 480), most('carbon dioxide', 1800), most('carbon dioxide', 2400), most('chlorine', 480)]).toEqual([54, 68, 74.5, 125]);
  });

  it('takes the row of the cylinder, and cautions one that is marked below every row', () => {
    expect(findingsOf(rule, holding({ 'carbon dioxide': 1 }, 0.69, { workingPressure: psi(1999) }))).toMatchObject([{ verdict: 'hold', limit: '68 %' }]);
    expect(findingsOf(rule, holding({ 'carbon dioxide': 1 }, 0.69, { workingPressure: psi(2000) }))).toMatchObject([{ verdict: 'note', limit: '70.3 %' }]);
    expect(findingsOf(rule, holding({ 'carbon dioxide': 1 }, 0.5, { workingPressure: psi(1799) }))).toMatchObject([{ verdict: 'caution' }]);
    expect(findingsOf(rule, holding({ 'carbon dioxide': 1 }, 0.5, { workingPressure: null }))).toMatchObject([{ verdict: 'caution', limit: '68 %' }]);
  });

  it('counts for (nearly) one gas only: 98 %, own choice', () => {
    expect(findingsOf(rule, holding({ 'carbon dioxide': 0.981, nitrogen: 0.019 }, 0.9))).toHaveLength(1);
    expect(findingsOf(rule, holding({ 'carbon dioxide': 0.979, nitrogen: 0.021 }, 0.9))).toEqual([]);
    expect(findingsOf(rule, holding({ nitrogen: 1 }, 0.9))).toEqual([]);
  });
});

describe('filling-ratio', () => {
  const rule = 'filling-ratio';

  // UN P200, from memory: CO₂ 0.68 at 190 bar and 0.76 at 250; N₂O 0.68 at 180, 0.74 at 225, 0.75 at 250.
  it.each(fillingRatios.map(({ gas, from, limit }) => [gas, from, limit.value] as const))('%s tested at %d bar gauge: %d kg/L', (gas, from, ratio) => {
    const tested = { testPressure: bar(from + 1) };
    const mix: Mix = { [gas as GasId]: 1 };
    expect(findingsOf(rule, holding(mix, ratio * 1.001, tested))).toMatchObject([{ verdict: 'caution', limit: `${ratio} kg/L` }]);
    expect(findingsOf(rule, holding(mix, ratio * 0.999, tested))).toMatchObject([{ verdict: 'note' }]);
  });

  it('formula of P200 (3)(b), by hand: 250 bar, 44.009 g/mol, 338 K give 0.3915 kg/L', () => {
    // 250 × 44.009 × 10⁻³ / (0.0831451 × 338) = 11.00225 / 28.10304.
    expect(fillingRatioOfMixture(250, 44.009)).toBeCloseTo(0.39150, 4);
  });

  it('judges a mixture by the formula from its mean molar mass, on both sides', () => {
    // Half CO₂ and half ethane, M = (44.0095 + 30.069)/2 = 37.04; tested at 300 bar gauge: 0.3954 kg/L.
    const mix: Mix = { 'carbon dioxide': 0.5, ethane: 0.5 };
    expect(findingsOf(rule, holding(mix, 0.397))).toMatchObject([{ verdict: 'caution', limit: '0.395 kg/L' }]);
    expect(findingsOf(rule, holding(mix, 0.394))).toMatchObject([{ verdict: 'note' }]);
  });

  it('leaves compressed gas alone: mean critical temperature below −50 °C (UN 2.2.1.2, from memory)', () => {
    // 304.13 x + 126.19 (1 − x) = 223.15 at x = 0.5449.
    expect(findingsOf(rule, holding({ 'carbon dioxide': 0.544, nitrogen: 0.456 }, 0.9))).toEqual([]);
    expect(findingsOf(rule, holding({ 'carbon dioxide': 0.546, nitrogen: 0.454 }, 0.9))).toHaveLength(1);
  });

  it('counts against the plan when the test pressure is not stated', () => {
    expect(findingsOf(rule, holding({ ethane: 1 }, 0.1, { testPressure: null }))).toMatchObject([{ verdict: 'caution', figure: 'not computed' }]);
  });
});

describe('nitric-oxide-pressure', () => {
  const rule = 'nitric-oxide-pressure';
  /** Nitric oxide and nitrogen to an absolute pressure at 20 °C, of ideal gas. */
  const nitricOxide = (content: number, absolute: number): UncheckedPlan => planFixture({
    parents: { no: { mix: { 'nitric oxide': content, nitrogen: 1 - content } } }, additions: [['no', absolute]],
  });
  const at20 = (absolute: number, celsius: number): number => (absolute * 293.15) / (celsius + 273.15);

  it('cautions above 750 psi gauge at 21.1 °C (49 CFR 173.302a, as read in a public copy)', () => {
    // 750 psi = 51.711 bar gauge = 52.711 bar absolute.
    expect(verdictsOf(rule, nitricOxide(1, at20(52.72, 21.1)))).toMatchObject({ [`${rule}:cylinder:United-States`]: 'caution' });
    expect(verdictsOf(rule, nitricOxide(1, at20(52.70, 21.1)))).not.toHaveProperty([`${rule}:cylinder:United-States`]);
  });

  it('cautions above 33 bar gauge at 15 °C (UN P200, from memory)', () => {
    expect(findingsOf(rule, nitricOxide(1, at20(34.01, 15)))).toMatchObject([{ verdict: 'caution', limit: '33.0 bar gauge', trust: 'from memory' }]);
    expect(findingsOf(rule, nitricOxide(1, at20(33.99, 15)))).toEqual([]);
  });

  it('counts the partial pressure below half nitric oxide, the total from there on (own choice)', () => {
    expect(findingsOf(rule, nitricOxide(0.49, 60))).toEqual([]);
    expect(verdictsOf(rule, nitricOxide(0.49, 71))).toEqual({ [`${rule}:cylinder:UN`]: 'caution' });
    expect(verdictsOf(rule, nitricOxide(0.51, 40))).toEqual({ [`${rule}:cylinder:UN`]: 'caution' });
  });

  it('counts against the plan when not computed, except for a trace', () => {
    const blind = (content: number): unknown => {
      const plan = nitricOxide(content, 100);
      return verdictsOf(rule, { ...plan, final: { ...plan.final, developedPressures: [] } }, { pressureAt: () => fail({ code: 'not-converged' }) });
    };
    expect(blind(0.02)).toEqual({ [`${rule}:cylinder:United-States`]: 'caution', [`${rule}:cylinder:UN`]: 'caution' });
    expect(blind(0.009)).toEqual({});
  });
});

describe('overfill-not-allowed', () => {
  const rule = 'overfill-not-allowed';
  const mixed = (mix: Mix): unknown => findingsOf(rule, planFixture({ parents: { gas: { mix } }, additions: [['gas', 100]], tolerance: { methane: 0, 'hydrogen sulfide': 0 } }));

  it('notes flammable and poisonous gas, on both sides of their limits (49 CFR 173.302a(b), as read in a public copy)', () => {
    expect(mixed({ methane: 0.0871, nitrogen: 0.9129 })).toMatchObject([{ verdict: 'note', figure: 'flammable' }]);
    expect(mixed({ methane: 0.0869, nitrogen: 0.9131 })).toEqual([]);
    // 712/5000 = 14.24 % of H₂S; that much is flammable too.
    expect(mixed({ 'hydrogen sulfide': 0.1425, nitrogen: 0.8575 })).toMatchObject([{ figure: 'flammable, poisonous' }]);
    expect(mixed({ 'hydrogen sulfide': 0.1423, nitrogen: 0.8577 })).toMatchObject([{ figure: 'flammable' }]);
    expect(mixed({ benzene: 0.002, nitrogen: 0.998 })).toMatchObject([{ figure: 'poisonous' }]);
  });
});
