import { describe, expect, it } from 'vitest';
import { compositionFromMasses } from '../../../src/blending/index.ts';
import { planned, pure, valueOf } from '../lab.ts';
import { gasRecord } from '../../../src/thermo/index.ts';

describe('compositionFromMasses', () => {
  it('equal amounts of two pure gases', () => {
    const x = valueOf(compositionFromMasses([[1, 0], [0, 1]], [28, 44], [28, 44]));
    expect([...x]).toEqual([0.5, 0.5]);
  });

  it('gives back the composition of a plan from its masses', () => {
    const plan = planned({
      order: [['CO', '50 µmol/mol'], ['CO2', '5 %'], ['N2', 'balance']], to: '150 bar',
      parents: [{ key: 'a', lines: [['CO', '1 %'], ['N2', 'balance'], ['O2', '20 µmol/mol']] }, pure('CO2'), pure('N2')],
    });
    const molarMasses = plan.job.gases.map((gas) => gasRecord(gas).molarMass.value);
    const x = valueOf(compositionFromMasses(plan.job.parents.map(({ fractions }) => fractions), plan.steps.map(({ mass }) => mass), molarMasses));
    x.forEach((value, i) => expect(value).toBeCloseTo(plan.finished.fractions[i]!, 14));
  });

  it('a parent of which nothing was weighed in does not count', () => {
    expect([...valueOf(compositionFromMasses([[1, 0], [0, 1]], [1, 0], [28, 44]))]).toEqual([1, 0]);
  });

  it('refuses no mass at all, a negative one, a missing one', () => {
    expect(compositionFromMasses([[1], [1]], [0, 0], [28])).toEqual({ ok: false, reason: { code: 'no-mass' } });
    expect(compositionFromMasses([], [], [28])).toEqual({ ok: false, reason: { code: 'no-mass' } });
    expect(compositionFromMasses([[1], [1]], [1, -1], [28])).toEqual({ ok: false, reason: { code: 'mass-invalid', parent: 1 } });
    expect(compositionFromMasses([[1], [1]], [1], [28])).toEqual({ ok: false, reason: { code: 'mass-invalid', parent: 1 } });
    expect(compositionFromMasses([[1]], [Infinity], [28])).toEqual({ ok: false, reason: { code: 'mass-invalid', parent: 0 } });
  });
});
