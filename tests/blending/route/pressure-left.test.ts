import { describe, expect, it } from 'vitest';
import { cubicMetre, kelvin, kilogram, pascal } from '../../../src/units/index.ts';
import { realModel } from '../../../src/thermo/index.ts';
import { pressureLeft } from '../../../src/blending/route/pressure-left.ts';
import { jobOf, pure, valueOf } from '../lab.ts';

const job = jobOf({ order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar', parents: [pure('CO2', '57.3 bar'), pure('N2', '200 bar')] });
const model = valueOf(realModel(job.gases));
const [carbonDioxide, nitrogen] = [job.parents[0]!, { ...job.parents[1]!, waterCapacity: cubicMetre(0.05), temperature: kelvin(293.15) }];

describe('the pressure left in a parent', () => {
  it('is what the gas left has in the same volume, and nothing is lost by drawing nothing', () => {
    expect(pressureLeft(job, model, nitrogen, 0)).toBeCloseTo(200e5, 0);
    const held = valueOf(model.density(kelvin(293.15), pascal(200e5), nitrogen.fractions)).density * 0.05;
    const left = pressureLeft(job, model, nitrogen, held / 2)!;
    expect(valueOf(model.density(kelvin(293.15), left, nitrogen.fractions)).density * 0.05).toBeCloseTo(held / 2, 6);
  });

  it('is zero for more than it holds, and not known without its volume or its pressure', () => {
    expect(pressureLeft(job, model, nitrogen, 1e4)).toBe(0);
    expect(pressureLeft(job, model, { ...nitrogen, waterCapacity: null }, 1)).toBeNull();
    expect(pressureLeft(job, model, { ...nitrogen, pressure: null }, 1)).toBeNull();
  });

  it('stays at the vapour pressure of a liquefied parent until its mass is used up', () => {
    // Vapour pressure of carbon dioxide at 20 °C: 57.3 bar absolute (Span and Wagner 1996).
    expect(pressureLeft(job, model, carbonDioxide, 100)! / 1e5).toBeCloseTo(57.3, 1);
    const nearlyEmpty = { ...carbonDioxide, contentMass: kilogram(0.044) };
    expect(pressureLeft(job, model, nearlyEmpty, 0.99)! / 1e5).toBeCloseTo(57.3, 1);
    expect(pressureLeft(job, model, nearlyEmpty, 1.01)).toBe(0);
  });
});
