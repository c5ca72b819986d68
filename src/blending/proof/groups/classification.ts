import { fail, ok } from '../../../units/index.ts';
import type { ProofCase, ProofGroup } from '../case.ts';
import { evaluateRatio } from '../../hazards/gas-ratio.ts';
import { flammability, lowerFlammableLimit, oxidisingPowerRatio } from '../../hazards/iso10156.ts';
import { publishedOnly } from '../../values/value.ts';
import { absolute, formulaOf, figure, printed } from '../making.ts';

type Percent = Readonly<Record<string, number>>;

const fractions = (mixture: Percent): number[] => Object.values(mixture).map((percent) => percent / 100);
const words = (mixture: Percent): string => Object.entries(mixture).map(([gas, percent]) => `${percent} % ${formulaOf(gas)}`).join(', ');

const ISO = 'ISO 10156:2017, worked example (read second hand)';
const GHS = 'Globally Harmonized System, worked example';

const fourGases = { hydrogen: 2, methane: 8, argon: 25, helium: 65 };
const harmonised = { hydrogen: 2, methane: 6, argon: 27, helium: 65 };
const oxidising = { oxygen: 9, 'nitrous oxide': 16, helium: 75 };

const sums: readonly (readonly [id: string, mixture: Percent, published: number])[] = [
  ['H1', fourGases, 1.56], ['H2', { hydrogen: 5, nitrogen: 95 }, 0.91],
  ['H3', { 'carbon monoxide': 1, nitrogen: 99 }, 0.07], ['H4', { propane: 60, 'n-butane': 40 }, 27.33],
];

/** Flammable and oxidising by ISO 10156, through the functions that the rules use. */
export function classification(): ProofGroup {
  const common = { group: 'classification', unit: '', remark: '' } as const;
  const flammabilityOf = (mixture: Percent) => flammability(Object.keys(mixture), fractions(mixture));
  const cases: ProofCase[] = sums.map(([id, mixture, published]): ProofCase => ({
    ...common, id: `classification:${id}`, title: `${id}: ${words(mixture)}: Σ A′/Tci`, source: ISO, trust: 'published', published, tolerance: printed(2),
    compute: () => figure(flammabilityOf(mixture), ({ sum }) => sum),
  }));
  cases.push({
    ...common, id: 'classification:H1:limit', title: `H1: ${words(fourGases)}: lower flammable limit`, source: ISO, trust: 'published',
    published: 39.7, unit: '%', tolerance: printed(1), compute: () => lowerFlammableLimit(Object.keys(fourGases), fractions(fourGases), publishedOnly),
  });
  cases.push({
    ...common, id: 'classification:H9', title: `H9: ${words(harmonised)}: Σ A′/Tci`, source: GHS, trust: 'from memory', published: 1.29,
    tolerance: absolute(0.01), remark: 'the book cuts off instead of rounding', compute: () => figure(flammabilityOf(harmonised), ({ sum }) => sum),
  });
  (['hydrogen', 'methane'] as const).forEach((gas, index) => {
    cases.push({
      ...common, id: `classification:H9:${gas}`, title: `H9: nitrogen equivalent of ${formulaOf(gas)}`, source: GHS, trust: 'from memory',
      published: [2.46, 7.38][index]!, unit: '%', tolerance: printed(2),
      compute: () => figure(flammabilityOf(harmonised), ({ terms }) => terms.find((term) => term.gas === gas)?.equivalentPercent),
    });
  });
  cases.push({
    ...common, id: 'classification:H10', title: `H10: ${words(oxidising)}: oxidising power`, source: GHS, trust: 'from memory', published: 20.1, unit: '%', tolerance: printed(1),
    compute: () => {
      const ratio = oxidisingPowerRatio(Object.keys(oxidising), 'tabulated', publishedOnly);
      return ratio.ok ? ok(100 * evaluateRatio(ratio.value, fractions(oxidising))) : fail(ratio.reason);
    },
  });
  return {
    id: 'classification', title: 'Flammable and oxidising, ISO 10156',
    why: 'Half a unit of the last printed digit.',
    cases,
  };
}
