import { beforeAll, describe, expect, it, vi } from 'vitest';
import { kelvin } from '../../../src/units/index.ts';
import type * as Thermo from '../../../src/thermo/index.ts';

describe('before the equations outside GERG-2008 are loaded', () => {
  let fresh: typeof Thermo;

  beforeAll(async () => {
    vi.resetModules();
    fresh = await import('../../../src/thermo/index.ts');
  });

  it('the gases of GERG-2008 have their model', () => {
    expect(fresh.realModel(['nitrogen', 'helium']).ok).toBe(true);
    expect(fresh.vapourPressure('propane', kelvin(293.15)).ok).toBe(true);
  });

  it('the others say that theirs is not there yet, and have it afterwards', async () => {
    const reason = { code: 'equations-not-loaded', gases: ['neon', 'silane'] };
    for (const make of [fresh.realModel, fresh.idealModel]) expect(make(['neon', 'nitrogen', 'silane'])).toEqual({ ok: false, reason });
    expect(fresh.realModel(['neon', 'phlogiston' as never])).toMatchObject({ reason: { code: 'unknown-gas' } });
    expect(fresh.vapourPressure('sulfur dioxide', kelvin(293.15))).toEqual({ ok: false, reason: { code: 'equations-not-loaded', gas: 'sulfur dioxide' } });
    await fresh.loadAllGases();
    expect(fresh.vapourPressure('sulfur dioxide', kelvin(293.15)).ok).toBe(true);
    for (const make of [fresh.realModel, fresh.idealModel]) expect(make(['neon', 'nitrogen', 'silane']).ok).toBe(true);
  });
});
