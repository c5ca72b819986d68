import type { ProofCase, ProofGroup } from '../case.ts';
import { statePoints } from '../data/gerg-states.ts';
import { absolute, asPublished, atPressure, relative } from '../making.ts';

const source = 'NIST AGA8 Part 2 code, version 2.01, with 50 digits';

/** States of gases and blends that a bench meets, near the density solve's hard places too. */
export function gergStates(): ProofGroup {
  return {
    id: 'gerg-states', title: 'GERG-2008, states of gases and blends that a bench meets',
    why: 'The reference has 50 digits. 1e-10 relative in density is 1e-8 bar at 100 bar; the Gibbs energy is given as a part of RT.',
    cases: statePoints.flatMap(({ name, composition, temperature_K, pressure_kPa, density_mol_per_L, residualGibbsEnergy }, index): ProofCase[] => {
      const state = `${name}, ${temperature_K} K, ${pressure_kPa} kPa absolute`;
      const common = { group: 'gerg-states', source, trust: 'computed with reference code', remark: '' } as const;
      return [
        {
          ...common, id: `gerg-states:${index}:density`, title: `${state}: density`,
          published: density_mol_per_L, unit: 'mol/L', tolerance: relative(1e-10),
          compute: () => atPressure(composition, temperature_K, pressure_kPa, (found) => found.density / 1e3, asPublished),
        },
        {
          ...common, id: `gerg-states:${index}:residual-gibbs-energy`, title: `${state}: residual Gibbs energy / RT`,
          published: residualGibbsEnergy, unit: '', tolerance: absolute(1e-9),
          compute: () => atPressure(
            composition, temperature_K, pressure_kPa,
            (found, model) => found.residualGibbsEnergy / (model.gasConstant * temperature_K), asPublished,
          ),
        },
      ];
    }),
  };
}
