import { gasEquation, gasRecord } from '../../thermo/index.ts';
import type { GasEquation, GasId, GasRecord } from '../../thermo/index.ts';
import { gasFacts } from './facts.ts';
import type { GasFacts } from './facts.ts';

/** Everything that the catalogue says of a gas without computing. */
export interface GasCard {
  readonly record: GasRecord;
  readonly equation: GasEquation;
  readonly facts: GasFacts;
  /** Where the record comes from. */
  readonly sources: readonly string[];
}

const SOURCES: readonly string[] = [
  'Molar mass: CIAAW (IUPAC) standard atomic weights 2021; the uncertainty takes their intervals as rectangular (method from memory).',
  'Critical point, triple point, acentric factor: fluid files of CoolProp, after the reference equation of the gas; for gases with the Peng–Robinson equation IUPAC, DIPPR or Yaws.',
  'Boiling point: equal fugacity at 101.325 kPa with the reference equation, or a handbook value.',
];

/** The card of a gas: identity, equation with range, hazard figures, sources. */
export function gasCard(gas: GasId): GasCard {
  return { record: gasRecord(gas), equation: gasEquation(gas), facts: gasFacts(gas), sources: SOURCES };
}
