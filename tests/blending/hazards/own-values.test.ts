import { describe, expect, it } from 'vitest';
import { cautiousLimitingOxygen, flammableRow } from '../../../src/blending/hazards/data/flammable-gases.ts';
import { lacksLc50, toxicRow } from '../../../src/blending/hazards/data/toxic-gases.ts';
import { fuelOxidiserScale } from '../../../src/blending/hazards/fuel-and-oxidiser.ts';
import { roleOf } from '../../../src/blending/hazards/gas-roles.ts';
import { perGases } from '../../../src/blending/hazards/per-gases.ts';
import { ownFigure, publishedOnly, valueIn } from '../../../src/blending/values/value.ts';
import type { LaboratoryValues } from '../../../src/blending/values/value.ts';

const own = (values: Readonly<Record<string, number>>): LaboratoryValues =>
  new Map(Object.entries(values).map(([id, value]) => [id, { value, source: 'own copy', date: '2026-12-01' }]));

describe('valueIn', () => {
  it('is the published value unless the laboratory has its own', () => {
    const share = { id: 'hold-fuel-share', value: 0.25 };
    expect(valueIn(publishedOnly, share)).toBe(0.25);
    expect(valueIn(own({ 'hold-oxygen-share': 0.5 }), share)).toBe(0.25);
    expect(valueIn(own({ 'hold-fuel-share': 0.1 }), share)).toBe(0.1);
    expect(ownFigure(own({ 'lfl:methane': 5 }), 'lfl', 'methane')).toBe(5);
    expect(ownFigure(own({ 'lfl:methane': 5 }), 'ufl', 'methane')).toBeUndefined();
  });
});

describe('own figures in the tables', () => {
  it('replace a Tci from memory also on the cautious side, which would not use that one', () => {
    // Carbon monoxide: Tci 15.2 % from memory, so the lower limit of 10.9 % (published: IEC 60079-20-1) stands in.
    expect(roleOf('carbon monoxide', 'cautious', publishedOnly)).toMatchObject({ value: { tciPercent: 10.9, standIn: true } });
    expect(roleOf('carbon monoxide', 'cautious', own({ 'tci:carbon monoxide': 15.1 }))).toMatchObject({ value: { tciPercent: 15.1, standIn: false } });
  });

  it('move what stands in for a missing Tci when the lower limit is replaced', () => {
    expect(roleOf('n-pentane', 'cautious', own({ 'lfl:n-pentane': 1.4 }))).toMatchObject({ value: { tciPercent: 1.4, standIn: true } });
  });

  it('are used as they stand for the oxygen limit, without the correction of older methods', () => {
    const values = own({ 'loc:n-butane': 12 });
    expect(cautiousLimitingOxygen(flammableRow('n-butane', publishedOnly)!, publishedOnly)).toEqual({ percent: 10.5, standIn: false });
    expect(cautiousLimitingOxygen(flammableRow('n-butane', values)!, values)).toEqual({ percent: 12, standIn: false });
    const standIn = own({ 'loc-stand-in': 4 });
    expect(cautiousLimitingOxygen(flammableRow('n-octane', standIn)!, standIn)).toEqual({ percent: 4, standIn: true });
  });

  it('stand for gases without Kk or LC50, and make no row for a gas that no table names', () => {
    expect(roleOf('water', 'cautious', own({ 'kk:water': 1.2 }))).toMatchObject({ value: { equivalency: 1.2, standIn: false } });
    expect(roleOf('chlorine', 'cautious', own({ 'ci:chlorine': 0.8 }))).toMatchObject({ value: { coefficient: 0.8, standIn: false } });
    const values = own({ 'lc50:benzene': 13_700, 'lc50:nitrogen': 1, 'lfl:nitrogen': 1 });
    expect(lacksLc50('benzene', publishedOnly)).toBe(true);
    expect(lacksLc50('benzene', values)).toBe(false);
    expect(toxicRow('benzene', values)).toEqual({ gas: 'benzene', lc50: 13_700 });
    expect(toxicRow('nitrogen', values)).toBeUndefined();
    expect(roleOf('nitrogen', 'cautious', values)).toMatchObject({ value: { role: 'inert' } });
  });
});

describe('perGases', () => {
  it('makes a thing once for the same gases and values, and again for others', () => {
    let made = 0;
    const make = perGases(() => { made += 1; return made; });
    const gases = ['methane'];
    const values = own({ 'lfl:methane': 5 });
    expect([make(gases, publishedOnly), make(gases, publishedOnly), make(gases, values), make(gases, values), make(['methane'], values)]).toEqual([1, 1, 2, 2, 3]);
  });

  it('keeps the scale of one laboratory from another', () => {
    const gases = ['methane', 'nitrogen'];
    const fuelWeight = (values: LaboratoryValues) => {
      const scale = fuelOxidiserScale(gases, values);
      return scale.ok ? scale.value.fuel.over[0] : NaN;
    };
    expect(fuelWeight(publishedOnly)).toBeCloseTo(100 / 4.4, 12);
    expect(fuelWeight(own({ 'lfl:methane': 8.8 }))).toBeCloseTo(100 / 8.8, 12);
    expect(fuelWeight(publishedOnly)).toBeCloseTo(100 / 4.4, 12);
  });
});
