import { describe, expect, it } from 'vitest';
import { cubicMetre, kelvin, kilogram, pascal } from '../../../src/units/index.ts';
import { gasRecord, realModel } from '../../../src/thermo/index.ts';
import type { Job, JobParent } from '../../../src/blending/recipe/job.ts';
import { routeParents } from '../../../src/blending/route/parents.ts';
import { jobOf, pure, valueOf } from '../lab.ts';

const job = jobOf({ order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar', parents: [pure('CO2', '57.3 bar'), pure('N2', '200 bar')] });
const [carbonDioxide, nitrogen] = [job.parents[0]!, { ...job.parents[1]!, waterCapacity: cubicMetre(0.05), temperature: kelvin(293.15) }];
const molarMasses = Float64Array.from(job.gases, (gas) => gasRecord(gas).molarMass.value);

/** Pressure left in a parent after `drawn` mol, and `purged` mol more for a purge before. */
function leftIn(parent: JobParent, drawn: number, purged = 0, more: Partial<Job> = {}): number | null {
  const act = { kind: 'purge', parent: 0, low: pascal(1e5), high: pascal(5e5), cycles: 1, wanted: null } as const;
  const step = { step: 0, cycles: 1, pressure: pascal(1e5), oldGas: 0.2, byRule: 0.2, purgeGas: purged, before: new Float64Array(2), atHigh: null };
  const alone = { ...job, parents: [parent], conditioning: [act], ...more };
  return routeParents(alone, null, { additions: [drawn], conditioned: [step] }, molarMasses).parents[0]!.left;
}

const model = valueOf(realModel(job.gases));
const densityAt = (pressure: number): number => valueOf(model.density(kelvin(293.15), pascal(pressure), nitrogen.fractions)).density;
const held = densityAt(200e5) * 0.05;

describe('the pressure left in a parent', () => {
  it('is what the gas left has in the same volume', () => {
    expect(densityAt(leftIn(nitrogen, held / 2)!) * 0.05).toBeCloseTo(held / 2, 6);
  });

  it('counts what its purges drew, and every cylinder on a manifold', () => {
    expect(leftIn(nitrogen, 20, 10)).toBeCloseTo(leftIn(nitrogen, 30)!, 3);
    const three = { batch: { cylinders: 3, together: true, boosterInlet: null } };
    expect(leftIn(nitrogen, 20, 10, three)).toBeCloseTo(leftIn(nitrogen, 90)!, 3);
    expect(leftIn(nitrogen, 20, 10, { batch: { ...three.batch, together: false } })).toBeCloseTo(leftIn(nitrogen, 30)!, 3);
  });

  it('is zero for more than it holds, and not known without its volume or its pressure', () => {
    expect(leftIn(nitrogen, held + 1)).toBe(0);
    expect(leftIn({ ...nitrogen, waterCapacity: null }, 1)).toBeNull();
    expect(leftIn({ ...nitrogen, pressure: null }, 1)).toBeNull();
  });

  it('stays at the vapour pressure of a liquefied parent until its mass is used up, and is not known without it', () => {
    // Published (Span and Wagner 1996): vapour pressure of carbon dioxide at 20 °C 57.3 bar absolute.
    const liquefied: JobParent = { ...carbonDioxide, filling: 'liquefied' };
    expect(leftIn(liquefied, 1)).toBeNull();
    const nearlyEmpty: JobParent = { ...liquefied, contentMass: kilogram(0.044) };
    expect(leftIn(nearlyEmpty, 0.99)! / 1e5).toBeCloseTo(57.3, 1);
    expect(leftIn(nearlyEmpty, 1.01)).toBe(0);
  });
});
