import { cautiousLimitingOxygen, flammableGases, flammableRow } from '../data/flammable-gases.ts';
import type { FlammableRow } from '../data/flammable-gases.ts';
import { limitOrigins } from '../data/limit-origins.ts';
import { inertGases, inertRow, polyatomicDefault } from '../data/inert-gases.ts';
import { oxidiserRow, oxidisingGases } from '../data/oxidising-gases.ts';
import { toxicGases, toxicRow } from '../data/toxic-gases.ts';
import { publishedOnly } from '../../values/value.ts';
import type { ListedValue } from './listed.ts';

/**
 * The coefficients and limits of the gas tables. Where a figure is missing, what
 * stands in for it is listed, because that is what a laboratory would replace.
 */

type Told = Pick<ListedValue, 'value' | 'source' | 'trust'>;

const OWN_CHOICE = 'common practice, no source';

/** Limits in air, Tci and limiting oxygen concentration of every flammable gas. */
export function flammabilityValues(): readonly ListedValue[] {
  return flammableGases.flatMap((gas) => {
    const row = flammableRow(gas, publishedOnly)!;
    const [lower, upper] = limitOrigins(gas);
    const line = (table: string, quantity: string, told: Told): ListedValue =>
      ({ id: `${table}:${gas}`, section: 'Flammability', quantity, gas, unit: '%', ...told });
    return [
      line('lfl', 'Lower flammable limit in air', { value: row.lflPercent, ...lower }),
      line('ufl', 'Upper flammable limit in air', { value: row.uflPercent, ...upper }),
      line('tci', 'Tci, highest content in nitrogen that no addition of air makes flammable', tciOf(row)),
      line('loc', 'Limiting oxygen concentration in nitrogen, as judged with', limitingOxygenOf(row)),
    ];
  });
}

function tciOf({ tci, lflPercent }: FlammableRow): Told {
  if (tci === null) return { value: lflPercent, source: 'None found; the lower flammable limit stands in', trust: OWN_CHOICE };
  const source = 'ISO 10156:2017, read second hand';
  return tci.trust === 'seen'
    ? { value: tci.percent, source, trust: tci.trust }
    : { value: tci.percent, source: 'ISO 10156:2017; on the cautious side the lower flammable limit is used instead', trust: tci.trust };
}

function limitingOxygenOf(row: FlammableRow): Told {
  const value = cautiousLimitingOxygen(row, publishedOnly).percent;
  if (row.limitingOxygen === null) return { value, source: 'None found; the lowest of the table stands in', trust: OWN_CHOICE };
  const { percent, basis } = row.limitingOxygen;
  return basis === 'tube'
    ? { value, source: `Older tube method ${String(percent)} %, lowered as NFPA 69 TIA 1211 does`, trust: 'from memory' }
    : { value, source: 'ASTM E2079-19, vessel', trust: 'seen' };
}

/** Kk of every inert and Ci of every oxidising gas. */
export function equivalencyValues(): readonly ListedValue[] {
  const inert = inertGases.map((gas): ListedValue => {
    const { listed } = inertRow(gas, publishedOnly)!;
    const told: Told = listed === null
      ? { value: polyatomicDefault.value, source: 'Not in ISO 10156:2017 Table 1; its note for gases of three or more atoms stands in, on the cautious side the lowest Kk', trust: OWN_CHOICE }
      : { value: listed, source: 'ISO 10156:2017 Table 1', trust: 'seen' };
    return { id: `kk:${gas}`, section: 'Flammability', quantity: 'Kk, coefficient of nitrogen equivalency', gas, unit: '', ...told };
  });
  const oxidising = oxidisingGases.map((gas): ListedValue => {
    const { coefficient, trust } = oxidiserRow(gas, publishedOnly)!;
    return {
      id: `ci:${gas}`, section: 'Oxidising power and oxygen', quantity: 'Ci, coefficient of oxygen equivalency', gas, value: coefficient, unit: '',
      source: 'ISO 10156:2017 clause 5', trust,
    };
  });
  return [...inert, ...oxidising];
}

/** LC50 of every toxic gas. */
export function toxicityValues(): readonly ListedValue[] {
  return toxicGases.map((gas) => {
    const row = toxicRow(gas, publishedOnly);
    const told: Told = row === undefined
      ? { value: null, source: 'None found; the gas counts as toxic with an unknown figure', trust: OWN_CHOICE }
      : { value: row.lc50, source: 'ISO 10298; UN Model Regulations P200', trust: 'from memory' };
    return { id: `lc50:${gas}`, section: 'Toxicity', quantity: 'LC50, rat, 1 h', gas, unit: 'µmol/mol', ...told };
  });
}
