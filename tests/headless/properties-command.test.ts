import { describe, expect, it } from 'vitest';
import { propertiesCommand } from '../../src/headless/properties-command.ts';

type Answer = Readonly<Record<string, unknown>> & { readonly ok: boolean };

function properties(states: unknown, ...flags: string[]) {
  const { output, exitCode } = propertiesCommand(JSON.stringify(states), flags);
  return { exitCode, answers: JSON.parse(output) as readonly Answer[] };
}

const composition = { nitrogen: 0.95, 'carbon dioxide': 0.05 };
const state = { composition, temperature_K: 293.15, pressure_kPa: 15000 };

describe('properties', () => {
  it('answers every property of a state', () => {
    const { exitCode, answers } = properties([state], '--gas-constant=gerg2008');
    expect(exitCode).toBe(0);
    const [answer] = answers;
    expect(Object.keys(answer!)).toEqual(expect.arrayContaining([
      'ok', 'phase', 'model', 'molarMass_g_per_mol', 'density_mol_per_L', 'pressure_kPa', 'compressibilityFactor', 'lnFugacityCoefficient',
      'residualEntropy_J_per_molK', 'residualEnthalpy_J_per_mol', 'residualGibbsEnergy_J_per_mol', 'isobaricHeatCapacity_J_per_molK', 'speedOfSound_m_per_s',
    ]));
    // Computed with the NIST GERG-2008 code: 61.4986 mol in 10 L, Z 1.00069.
    expect(answer!.density_mol_per_L).toBeCloseTo(6.14986, 5);
    expect(answer!.compressibilityFactor).toBeCloseTo(1.00069, 5);
    expect(Object.keys(answer!.lnFugacityCoefficient as object)).toEqual(['nitrogen', 'carbon dioxide']);
    expect(answer!.model).toBe('GERG-2008, fitted');
  });

  it('takes a density in place of the pressure', () => {
    const density = properties([state]).answers[0]!.density_mol_per_L;
    const { answers } = properties([{ composition, temperature_K: 293.15, density_mol_per_L: density }]);
    expect((answers[0]!.pressure_kPa as number) / 15000).toBeCloseTo(1, 11);
  });

  it('the gas constant of the publication moves the density by its ratio', () => {
    const thin = { composition, temperature_K: 293.15, pressure_kPa: 1 };
    const ratio = (properties([thin]).answers[0]!.density_mol_per_L as number)
      / (properties([thin], '--gas-constant=gerg2008').answers[0]!.density_mol_per_L as number);
    expect(ratio).toBeCloseTo(8.314472 / 8.314462618, 9);
  });

  it.each([
    [7, 'state-not-an-object'], [null, 'state-not-an-object'], [[], 'state-not-an-object'],
    [{ ...state, pressure_bar: 5 }, 'field-unknown'],
    [{ ...state, temperature_K: '293' }, 'field-not-a-number'],
    [{ ...state, pressure_kPa: null }, 'field-not-a-number'],
    [{ temperature_K: 293.15, pressure_kPa: 100 }, 'field-not-a-number'],
    [{ ...state, composition: { nitrogen: '1' } }, 'field-not-a-number'],
    [{ composition, temperature_K: 293.15 }, 'pressure-or-density'],
    [{ ...state, density_mol_per_L: 1 }, 'pressure-or-density'],
    [{ composition, temperature_K: 293.15, density_mol_per_L: 'thin' }, 'field-not-a-number'],
    [{ ...state, composition: { phlogiston: 1 } }, 'unknown-gas'],
    [{ ...state, composition: {} }, 'no-gases'],
    [{ ...state, composition: { nitrogen: 0.5, N2: 0.5 } }, 'duplicate-gas'],
    [{ ...state, composition: { nitrogen: 0.5 } }, 'fractions-do-not-sum'],
    [{ ...state, composition: { nitrogen: 1.5, argon: -0.5 } }, 'fraction-invalid'],
    [{ ...state, temperature_K: 0 }, 'temperature-invalid'],
    [{ ...state, pressure_kPa: -1 }, 'pressure-invalid'],
    [{ composition, temperature_K: 293.15, density_mol_per_L: -1 }, 'density-invalid'],
    [{ composition: { propane: 1 }, temperature_K: 293.15, pressure_kPa: 5000 }, 'no-gas-root'],
  ])('%j: %s', (bad, code) => {
    const { exitCode, answers } = properties([bad, state]);
    expect(exitCode).toBe(0);
    expect(answers[0]).toMatchObject({ ok: false, reason: { code } });
    // One bad state does not spoil the others.
    expect(answers[1]!.ok).toBe(true);
  });

  it.each(['', '{}', 'null', '[', '"[]"'])('%j is no array of states', (text) => {
    const { output, exitCode } = propertiesCommand(text, []);
    expect(exitCode).toBe(1);
    expect(JSON.parse(output)).toMatchObject({ ok: false, reason: { code: 'not-a-json-array' } });
  });

  it('no states, no answers', () => {
    expect(properties([])).toEqual({ exitCode: 0, answers: [] });
  });

  it('answers a thousand states, in order, all finite', () => {
    const states = Array.from({ length: 1000 }, (_, k) => ({
      composition: { methane: 0.9 - (k % 10) / 100, nitrogen: 0.1 + (k % 10) / 100 }, temperature_K: 260 + (k % 77), pressure_kPa: 100 + 19 * k,
    }));
    const { output } = propertiesCommand(JSON.stringify(states), []);
    const answers = JSON.parse(output) as readonly Answer[];
    expect(answers).toHaveLength(1000);
    answers.forEach((answer, k) => expect((answer.pressure_kPa as number) / states[k]!.pressure_kPa).toBeCloseTo(1, 10));
    expect(output).not.toContain(': null');
  });
});
