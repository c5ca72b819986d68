import { describe, expect, it } from 'vitest';
import { kunzWagnerGases } from '../../src/thermo/data/kunz-wagner-2012/gases.ts';
import type { KunzWagnerGas } from '../../src/thermo/data/kunz-wagner-2012/gases.ts';
import type { GasId } from '../../src/thermo/index.ts';
import { kelvin, pascal } from '../../src/units/index.ts';
import fixture from '../fixtures/gerg2008-states.json' with { type: 'json' };
import { given, modelOf } from '../thermo/given.ts';

const R = fixture.gasConstant_J_per_molK;

describe('published: NIST GERG-2008 code at 50 digits, 64 states a bench meets', () => {
  it.each(fixture.states.map((state) => ({ ...state, title: `${state.name}, ${state.T_K} K, ${state.p_kPa} kPa` })))('$title', (known) => {
    const model = modelOf(known.gases as GasId[], { gasConstant: 'gerg2008' });
    const state = given(model.stateAtPressure(kelvin(known.T_K), pascal(known.p_kPa * 1e3), known.x));
    const rt = R * known.T_K;

    expect(Math.abs(state.density / (known.rho_mol_per_L * 1e3) - 1)).toBeLessThan(1e-10);
    expect(Math.abs(state.compressibilityFactor / known.Z - 1)).toBeLessThan(1e-10);

    for (const [i, lnPhi] of known.lnPhi.entries()) expect(Math.abs(state.lnFugacityCoefficients[i]! - lnPhi)).toBeLessThan(1e-9);
    expect(Math.abs(state.residualEntropy - known.sRes_J_per_molK) / R).toBeLessThan(1e-9);
    expect(Math.abs(state.residualEnthalpy - known.hRes_J_per_mol) / rt).toBeLessThan(1e-9);
    expect(Math.abs(state.residualGibbsEnergy - known.gRes_J_per_mol) / rt).toBeLessThan(1e-9);

    expect(Math.abs(state.isobaricHeatCapacity / known.cp_J_per_molK - 1)).toBeLessThan(1e-8);
    expect(Math.abs(state.isochoricHeatCapacity / known.cv_J_per_molK - 1)).toBeLessThan(1e-8);
    expect(Math.abs(state.speedOfSound / known.w_m_per_s - 1)).toBeLessThan(1e-8);
    expect(Math.abs(state.jouleThomsonCoefficient * 1e3 / known.JT_K_per_kPa - 1)).toBeLessThan(1e-8);

    expect(Math.abs(state.enthalpy - known.h_J_per_mol) / rt).toBeLessThan(1e-9);
    expect(Math.abs(state.entropy - known.s_J_per_molK) / R).toBeLessThan(1e-9);
    expect(Math.abs(state.gibbsEnergy - known.g_J_per_mol) / rt).toBeLessThan(1e-9);
    expect(Math.abs(state.enthalpy - state.pressure / state.density - known.u_J_per_mol) / rt).toBeLessThan(1e-9);
  });
});

describe('published: the 21-component point of the NIST AGA8 GERG-2008 test program', () => {
  const fractions: Readonly<Record<KunzWagnerGas, number>> = {
    methane: 0.77824, nitrogen: 0.02, 'carbon dioxide': 0.06, ethane: 0.08, propane: 0.03, isobutane: 0.0015, 'n-butane': 0.003,
    isopentane: 0.0005, 'n-pentane': 0.00165, 'n-hexane': 0.00215, 'n-heptane': 0.00088, 'n-octane': 0.00024, 'n-nonane': 0.00015,
    'n-decane': 0.00009, hydrogen: 0.004, oxygen: 0.005, 'carbon monoxide': 0.002, water: 0.0001, 'hydrogen sulfide': 0.0025,
    helium: 0.007, argon: 0.001,
  };
  const model = modelOf(kunzWagnerGases, { gasConstant: 'gerg2008' });
  const state = given(model.stateAtPressure(kelvin(400), pascal(50e6), kunzWagnerGases.map((gas) => fractions[gas])));

  it.each([
    ['molar mass, g/mol', state.molarMass * 1e3, 20.5427445016],
    ['density, mol/L', state.density / 1e3, 12.79828626082062],
    ['Z', state.compressibilityFactor, 1.174690666383717],
    ['dp/dρ, kPa L/mol', state.pressureByDensity, 7000.694030193327],
    ['u, J/mol', state.enthalpy - state.pressure / state.density, -2746.49290121253],
    ['h, J/mol', state.enthalpy, 1160.280160510973],
    ['s, J/(mol K)', state.entropy, -38.57590392409089],
    ['cv, J/(mol K)', state.isochoricHeatCapacity, 39.02948218156372],
    ['cp, J/(mol K)', state.isobaricHeatCapacity, 58.45522051000366],
    ['w, m/s', state.speedOfSound, 714.4248840596024],
    ['g, J/mol', state.gibbsEnergy, 16590.64173014733],
    ['Joule–Thomson, K/kPa', state.jouleThomsonCoefficient * 1e3, 7.155629581480913e-5],
  ])('%s', (_, computed, published) => {
    expect(Math.abs(computed / published - 1)).toBeLessThan(1e-11);
  });

  it('lies in the extended range', () => {
    expect(state.range).toBe('extended');
  });
});
