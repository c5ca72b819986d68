/** What is known of a gas beside its equation: what it does in a flame and to people. */
import type { GasId } from '../../thermo/index.ts';
import type { Trust } from '../hazards/finding.ts';
import { flammableRow } from '../hazards/data/flammable-gases.ts';
import { inertRow } from '../hazards/data/inert-gases.ts';
import { oxidiserRow } from '../hazards/data/oxidising-gases.ts';
import { lacksLc50, toxicRow } from '../hazards/data/toxic-gases.ts';

/** One figure of a gas with where it comes from and how far that was checked. */
export interface GasFigure {
  readonly name: string;
  readonly value: number;
  readonly unit: string;
  readonly source: string;
  readonly trust: Trust;
}

/** What the tables of this program say of a gas. `unclassified`: none of them names it. */
export interface GasFacts {
  readonly gas: GasId;
  readonly roles: readonly GasRoleName[];
  readonly figures: readonly GasFigure[];
  /** Harmful to people by its hazard statements, and without an LC50 here. */
  readonly lacksLc50: boolean;
}

export type GasRoleName = 'flammable' | 'oxidising' | 'neither flammable nor oxidising' | 'toxic' | 'unclassified';

type Origin = Pick<GasFigure, 'source' | 'trust'>;

const LISTS: Origin = { source: 'IEC 60079-20-1:2010 and NFPA 497 (2008), in air at atmospheric pressure', trust: 'seen' };

/** Limits that are in neither of the two lists: lower, upper. */
const ELSEWHERE: Readonly<Partial<Record<GasId, readonly [Origin, Origin]>>> = {
  deuterium: both({ source: 'limits of hydrogen stand in', trust: 'common practice, no source' }),
  phosphine: [{ source: 'NIOSH; may light by itself', trust: 'seen' }, { source: 'no limit known, 100 % stands in', trust: 'common practice, no source' }],
  arsine: [{ source: 'NIOSH', trust: 'seen' }, { source: 'a general reference', trust: 'seen' }],
  silane: both({ source: 'may light by itself; counted as flammable from 0.5 %', trust: 'common practice, no source' }),
};

function both(origin: Origin): readonly [Origin, Origin] {
  return [origin, origin];
}

/**
 * Roles and hazard figures of a gas, as the rules use them. A figure that is not
 * listed was not found; that never means zero or harmless.
 */
export function gasFacts(gas: GasId): GasFacts {
  const fuel = flammableRow(gas);
  const oxidiser = oxidiserRow(gas);
  const inert = inertRow(gas);
  const toxic = toxicRow(gas);
  const roles: GasRoleName[] = [];
  const figures: GasFigure[] = [];
  if (fuel !== undefined) {
    roles.push('flammable');
    const [lower, upper] = ELSEWHERE[gas] ?? both(LISTS);
    figures.push({ name: 'lower flammable limit, the lowest found', value: fuel.lflPercent, unit: '%', ...lower });
    figures.push({ name: 'upper flammable limit, the highest found', value: fuel.uflPercent, unit: '%', ...upper });
    if (fuel.tci !== null) {
      figures.push({ name: 'Tci: highest content in nitrogen that no addition of air makes flammable', value: fuel.tci.percent, unit: '%', source: 'ISO 10156:2017', trust: fuel.tci.trust });
    }
    if (fuel.limitingOxygen !== null) {
      const { percent, basis } = fuel.limitingOxygen;
      figures.push({
        name: 'limiting oxygen concentration in nitrogen', value: percent, unit: '%',
        ...(basis === 'vessel'
          ? { source: 'ASTM E2079-19, vessel', trust: 'seen' as const }
          : { source: 'older tube method, reads about 1.5 points too high', trust: 'from memory' as const }),
      });
    }
  }
  if (oxidiser !== undefined) {
    roles.push('oxidising');
    figures.push({ name: 'Ci: oxygen equivalency', value: oxidiser.coefficient, unit: '', source: 'ISO 10156:2017 clause 5', trust: oxidiser.trust });
  }
  if (inert !== undefined) {
    roles.push('neither flammable nor oxidising');
    if (inert.listed !== null) {
      figures.push({ name: 'Kk: nitrogen equivalency', value: inert.listed, unit: '', source: 'ISO 10156:2017 Table 1', trust: 'seen' });
    }
  }
  if (toxic !== undefined || lacksLc50(gas)) roles.push('toxic');
  if (toxic !== undefined) {
    figures.push({ name: 'LC50, rat, 1 h, the lowest found', value: toxic.lc50, unit: 'µmol/mol', source: 'ISO 10298; UN Model Regulations P200', trust: 'from memory' });
  }
  const classified = fuel !== undefined || oxidiser !== undefined || inert !== undefined;
  return { gas, roles: classified ? roles : ['unclassified', ...roles], figures, lacksLc50: lacksLc50(gas) };
}
