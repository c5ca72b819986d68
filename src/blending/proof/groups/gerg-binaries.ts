import { kelvin, molePerCubicMetre } from '../../../units/index.ts';
import type { ProofGroup } from '../case.ts';
import { binaryPoints } from '../data/gerg-binaries.ts';
import { asPublished, figure, formulaOf, modelOf, relative } from '../making.ts';

/** One point of every pair of GERG-2008: a lost or changed pair parameter shows here. */
export function gergBinaries(): ProofGroup {
  return {
    id: 'gerg-binaries', title: 'GERG-2008, one point of each of the 210 pairs',
    why: 'Printed to eight digits: 2e-7 relative is four units of the last one.',
    cases: binaryPoints.map(({ gases: [first, second], temperature_K, density_mol_per_L, pressure_MPa }) => ({
      id: `gerg-binaries:${first}+${second}`, group: 'gerg-binaries',
      title: `${formulaOf(first)} + ${formulaOf(second)}, 1 : 1, ${temperature_K} K, ${density_mol_per_L} mol/L: pressure`,
      source: 'NIST AGA8 repository, workbook of equimolar binary mixtures', trust: 'published',
      published: pressure_MPa, unit: 'MPa absolute', tolerance: relative(2e-7), remark: '',
      compute: () => {
        const made = modelOf({ [first]: 0.5, [second]: 0.5 }, asPublished);
        if (!made.ok) return made;
        const { model, x } = made.value;
        return figure(model.pressure(kelvin(temperature_K), molePerCubicMetre(density_mol_per_L * 1e3), x), (pressure) => pressure / 1e6);
      },
    })),
  };
}
