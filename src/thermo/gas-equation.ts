/** Which published equation stands for a pure gas, and where its authors state it. */
import { kelvin, pascal } from '../units/index.ts';
import type { Kelvin, Pascal } from '../units/index.ts';
import type { GasId } from './data/gases.ts';
import { equationsBeyondGerg } from './model/library.ts';
import { helmholtzGases } from './data/helmholtz/gases.ts';
import type { HelmholtzGas } from './data/helmholtz/gases.ts';
import { kunzWagnerGases } from './data/kunz-wagner-2012/gases.ts';

/** Where an equation is stated (pressure absolute). */
export interface StatedRange {
  readonly lowest: Kelvin;
  readonly highest: Kelvin;
  readonly highestPressure: Pascal;
  readonly fromMemory: boolean;
}

/** The equation of a gas. */
export interface GasEquation {
  readonly kind: 'GERG-2008' | 'Helmholtz' | 'Peng–Robinson';
  readonly source: string;
  /** null: none is stated. */
  readonly range: StatedRange | null;
}

/** The equation of a gas; for GERG-2008 the normal range. */
export function gasEquation(gas: GasId): GasEquation {
  if (kunzWagnerGases.some((id) => id === gas)) {
    return {
      kind: 'GERG-2008', source: 'O. Kunz, W. Wagner, J. Chem. Eng. Data 57 (2012) 3032; ISO 20765-2',
      range: { lowest: kelvin(90), highest: kelvin(450), highestPressure: pascal(35e6), fromMemory: true },
    };
  }
  if (isHelmholtzGas(gas)) {
    const publication = equationsBeyondGerg()?.publications[gas];
    if (publication === undefined) return { kind: 'Helmholtz', source: 'not loaded yet', range: null };
    const { source, range: { temperature_K: [lowest, highest], pressure_MPa } } = publication;
    return { kind: 'Helmholtz', source, range: { lowest: kelvin(lowest), highest: kelvin(highest), highestPressure: pascal(pressure_MPa * 1e6), fromMemory: false } };
  }
  return { kind: 'Peng–Robinson', source: 'D.-Y. Peng, D. B. Robinson, Ind. Eng. Chem. Fundam. 15 (1976) 59', range: null };
}

/** What to call the model of a list of gases. */
export function modelName(gases: readonly GasId[]): string {
  return gases.every((gas) => gasEquation(gas).kind === 'GERG-2008') ? 'GERG-2008' : 'GERG-2008 with the published equations of other gases';
}

function isHelmholtzGas(gas: GasId): gas is HelmholtzGas {
  return helmholtzGases.some((id) => id === gas);
}
