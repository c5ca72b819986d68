/** What is known of a gas beside its equation: what it does in a flame and to people. */
import type { GasId } from '../../thermo/index.ts';
import { limitOrigins } from '../hazards/data/limit-origins.ts';
import type { LimitOrigin } from '../hazards/data/limit-origins.ts';
import type { Trust } from '../hazards/finding.ts';
import { flammableRow } from '../hazards/data/flammable-gases.ts';
import { inertRow } from '../hazards/data/inert-gases.ts';
import { oxidiserRow } from '../hazards/data/oxidising-gases.ts';
import { lacksLc50, toxicRow } from '../hazards/data/toxic-gases.ts';
import { publishedOnly } from '../values/value.ts';
import type { LaboratoryValues } from '../values/value.ts';

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

/**
 * Roles and hazard figures of a gas, as the rules use them, with the laboratory's
 * own in place where it has them. A figure that is not listed was not found; that
 * never means zero or harmless.
 */
export function gasFacts(gas: GasId, values: LaboratoryValues = publishedOnly): GasFacts {
  const fuel = flammableRow(gas, values);
  const oxidiser = oxidiserRow(gas, values);
  const inert = inertRow(gas, values);
  const toxic = toxicRow(gas, values);
  const roles: GasRoleName[] = [];
  const figures: GasFigure[] = [];
  const add = (table: string, name: string, value: number, unit: string, published: LimitOrigin): void => {
    const own = values.get(`${table}:${gas}`);
    const origin: LimitOrigin = own === undefined ? published : { source: `laboratory’s own value: ${own.source}, ${own.date}`, trust: 'seen' };
    figures.push({ name, value, unit, ...origin });
  };
  if (fuel !== undefined) {
    roles.push('flammable');
    const [lower, upper] = limitOrigins(gas);
    add('lfl', 'lower flammable limit, the lowest found', fuel.lflPercent, '%', lower);
    add('ufl', 'upper flammable limit, the highest found', fuel.uflPercent, '%', upper);
    if (fuel.tci !== null) {
      const { percent, trust } = fuel.tci;
      add('tci', 'Tci: highest content in nitrogen that no addition of air makes flammable', percent, '%', { source: 'ISO 10156:2017', trust });
    }
    if (fuel.limitingOxygen !== null) {
      const { percent, basis } = fuel.limitingOxygen;
      add('loc', 'limiting oxygen concentration in nitrogen', percent, '%', basis === 'tube'
        ? { source: 'older tube method, reads about 1.5 points too high', trust: 'from memory' }
        : { source: 'ASTM E2079-19, vessel', trust: 'seen' });
    }
  }
  if (oxidiser !== undefined) {
    roles.push('oxidising');
    add('ci', 'Ci: oxygen equivalency', oxidiser.coefficient, '', { source: 'ISO 10156:2017 clause 5', trust: oxidiser.trust });
  }
  if (inert !== undefined) {
    roles.push('neither flammable nor oxidising');
    if (inert.listed !== null) add('kk', 'Kk: nitrogen equivalency', inert.listed, '', { source: 'ISO 10156:2017 Table 1', trust: 'seen' });
  }
  const unknown = lacksLc50(gas, values);
  if (toxic !== undefined || unknown) roles.push('toxic');
  if (toxic !== undefined) {
    add('lc50', 'LC50, rat, 1 h, the lowest found', toxic.lc50, 'µmol/mol', { source: 'ISO 10298; UN Model Regulations P200', trust: 'from memory' });
  }
  const classified = fuel !== undefined || oxidiser !== undefined || inert !== undefined;
  return { gas, roles: classified ? roles : ['unclassified', ...roles], figures, lacksLc50: unknown };
}
