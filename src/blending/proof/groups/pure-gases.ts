import { kelvin, molePerCubicMetre } from '../../../units/index.ts';
import type { ProofCase, ProofGroup } from '../case.ts';
import { helmholtzRows } from '../data/helmholtz-states.ts';
import { pureGasRows } from '../data/pure-gases.ts';
import { absolute, atPressure, figure, formulaOf, gasOf, hasOwnEquation, modelOf, relative } from '../making.ts';

/** The short equations of these drift from the long ones with pressure. */
const drifting: ReadonlySet<string> = new Set(['oxygen', 'argon', 'helium']);

/** A point that lies closer to condensation than the short equation is good for. */
const known: Readonly<Record<string, { readonly tolerance: number; readonly remark: string }>> = {
  'propane:313.15:1000': { tolerance: 1.5e-3, remark: 'at seven tenths of its vapour pressure the short equation of propane is 0.12 % off the long one' },
};

function toleranceOf(gas: string, pressure_kPa: number): number {
  if (hasOwnEquation(gas)) return 1e-5;
  if (!drifting.has(gas)) return 5e-4;
  return pressure_kPa > 20_000 ? 2e-3 : 6.5e-4;
}

/** Pure gases against the long reference equation of each, computed apart from this program. */
export function pureGases(): ProofGroup {
  return {
    id: 'pure-gases', title: 'Pure gases, compressibility factor',
    why: '0.05 %: what the short equations of GERG-2008 differ by from the long ones at bench states. Oxygen, argon and helium: 0.065 % up to 20 MPa, 0.2 % above, where the short equations drift. Gases outside GERG-2008 have the long equation here too: 1e-5, for six printed decimals and a gas constant that differs by 1e-6.',
    cases: pureGasRows.filter(({ gas }) => gasOf(gas) !== null).flatMap(({ gas, source, points }) => points.map(([T_K, p_kPa, Z]): ProofCase => {
      const { tolerance, remark } = known[`${gas}:${T_K}:${p_kPa}`] ?? { tolerance: toleranceOf(gas, p_kPa), remark: '' };
      return {
        id: `pure-gases:${gas}:${T_K}:${p_kPa}`, group: 'pure-gases', title: `${formulaOf(gas)}, ${T_K} K, ${p_kPa} kPa absolute: Z`,
        source, trust: 'computed with reference code', published: Z, unit: '', tolerance: relative(tolerance), remark,
        compute: () => atPressure({ [gas]: 1 }, T_K, p_kPa, (state) => state.compressibilityFactor),
      };
    })),
  };
}

/** Pure gases outside GERG-2008 against another program with the same published equation. */
export function longEquations(): ProofGroup {
  return {
    id: 'long-equations', title: 'Gases outside GERG-2008, by their own published equation',
    why: 'The same equation in two programs: 1e-9 leaves room for rounding and for nothing else.',
    cases: helmholtzRows.filter(([gas]) => gasOf(gas) !== null).map(([gas, T_K, density_mol_per_L, Z]): ProofCase => ({
      id: `long-equations:${gas}`, group: 'long-equations', title: `${formulaOf(gas)}, ${T_K} K, ${density_mol_per_L} mol/L: Z`,
      source: 'CoolProp 8.0, reference equation of the gas', trust: 'computed with reference code', published: Z, unit: '', tolerance: relative(1e-9), remark: '',
      compute: () => {
        const made = modelOf({ [gas]: 1 });
        if (!made.ok) return made;
        const density = density_mol_per_L * 1e3;
        const { model, x } = made.value;
        return figure(model.pressure(kelvin(T_K), molePerCubicMetre(density), x), (pressure) => pressure / (density * model.gasConstant * T_K));
      },
    })),
  };
}

/** [T/K, p/bar, Z]. */
const air: readonly (readonly [number, number, number])[] = [
  [250, 20, 0.9822], [250, 100, 0.9411], [250, 200, 0.9713], [250, 300, 1.0702],
  [300, 20, 0.995], [300, 100, 0.993], [300, 200, 1.0326], [300, 300, 1.1089],
  [350, 20, 1.0014], [350, 100, 1.0183], [350, 200, 1.0635], [350, 300, 1.1303],
];

/** Air as nitrogen, oxygen and argon. */
export function airTable(): ProofGroup {
  return {
    id: 'air', title: 'Air, compressibility factor',
    why: 'The table is older than GERG-2008 and recalled from memory; the two agree within 0.001.',
    cases: air.map(([T_K, p_bar, Z]): ProofCase => ({
      id: `air:${T_K}:${p_bar}`, group: 'air', title: `Air, ${T_K} K, ${p_bar} bar absolute: Z`, source: 'Perry’s Chemical Engineers’ Handbook, 6th ed., Table 3-162',
      trust: 'from memory', published: Z, unit: '', tolerance: absolute(0.001), remark: '',
      compute: () => atPressure({ nitrogen: 0.7812, oxygen: 0.2096, argon: 0.0092 }, T_K, p_bar * 100, (state) => state.compressibilityFactor),
    })),
  };
}
