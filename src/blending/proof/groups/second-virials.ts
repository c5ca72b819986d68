import { kelvin } from '../../../units/index.ts';
import type { ProofCase, ProofGroup } from '../case.ts';
import { virialRows } from '../data/second-virials.ts';
import { absolute, figure, formulaOf, gasOf, hasOwnEquation, modelOf } from '../making.ts';

/** What the short equation of a gas in GERG-2008 is known to do; its tolerance is this share of the value. */
const known: Readonly<Record<string, { readonly share: number; readonly remark: string }>> = {
  water: { share: 0.12, remark: 'the short equation of water in GERG-2008 was made for natural gas; near room temperature its second virial coefficient is a tenth off IAPWS-95' },
};

const SHARE = 0.03;
/** cm³/mol; the handbook prints whole numbers. */
const LEAST = 1;
/** Where the program has the long equation itself: the second printed decimal. */
const ROUNDED = 0.0051;

/** Second virial coefficients: how a gas leaves ideality at low pressure. */
export function secondVirials(): ProofGroup {
  const cases = virialRows.filter(({ gas }) => gasOf(gas) !== null).flatMap(({ gas, longEquation, handbook }): ProofCase[] => {
    const { share = SHARE, remark = '' } = known[gas] ?? {};
    const compute = (): ReturnType<ProofCase['compute']> => {
      const made = modelOf({ [gas]: 1 });
      return made.ok ? figure(made.value.model.secondVirialCoefficient(kelvin(298.15), [1]), (value) => value * 1e6) : made;
    };
    const common = { group: 'second-virials', unit: 'cm³/mol', remark, compute } as const;
    const own = Math.max(LEAST, share * Math.abs(longEquation ?? handbook ?? 0));
    const againstLong = hasOwnEquation(gas) ? ROUNDED : own;
    const rows: ProofCase[] = [];
    if (longEquation !== null) {
      rows.push({
        ...common, id: `second-virials:${gas}:long-equation`, title: `${formulaOf(gas)}, 298.15 K: B, long equation`, source: 'long reference equation of the gas',
        trust: 'computed with reference code', published: longEquation, tolerance: absolute(againstLong),
      });
    }
    if (handbook !== null) {
      const scatter = longEquation === null ? 0 : Math.abs(handbook - longEquation);
      rows.push({
        ...common, id: `second-virials:${gas}:handbook`, title: `${formulaOf(gas)}, 298.15 K: B, handbook`, source: 'CRC Handbook of Chemistry and Physics, Virial coefficients of selected gases (Kehiaian)',
        trust: 'published', published: handbook, tolerance: absolute(scatter + own),
      });
    }
    return rows;
  });
  return {
    id: 'second-virials', title: 'Second virial coefficients',
    why: 'Against the long equation 3 % or 1 cm³/mol, and the printed decimals where the program has that equation itself. Against the handbook as much more as handbook and long equation differ from each other: that is the scatter of the published values, stated for each gas.',
    cases,
  };
}
