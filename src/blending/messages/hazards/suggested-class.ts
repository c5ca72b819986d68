import { formatNumber } from '../../../units/index.ts';

/** Sentences of the suggested class. Everything here is a suggestion. */

export const caveat = 'Suggested from the figures of this program; whoever hands the cylinder over for transport or supply decides, with the rules in force.';

export const transportSource = 'UN Model Regulations, list of dangerous goods (edition not read; numbers from memory and from public lists)';
export const ghsSource = 'Globally Harmonized System and CLP (read in part, the rest from memory)';
export const isoSource = 'ISO 10156 (2017, read second hand)';
export const toxicitySource = 'ISO 10298 and UN Model Regulations 2.2.3 (LC50 figures from memory)';

const subsidiaryNames: Readonly<Record<string, string>> = { '2.1': 'flammable', '5.1': 'oxidising', '8': 'corrosive' };
const divisionNames: Readonly<Record<string, string>> = {
  '2.1': 'flammable gas', '2.2': 'gas that is neither flammable nor toxic', '2.3': 'toxic gas',
};

export const divisionName = (division: string, subsidiary: readonly string[]): string => {
  const more = subsidiary.map((each) => subsidiaryNames[each] ?? each).join(' and ');
  return `Suggested for transport: ${divisionNames[division] ?? division}${more === '' ? '' : `, also ${more}`}`;
};

/** Shipping name in plain words: the form of the gas, its hazards, and the gases that make them. */
export const shippingName = (
  kind: 'single' | 'air' | 'mixture',
  { division, subsidiary, liquefied }: { readonly division: string; readonly subsidiary: readonly string[]; readonly liquefied: boolean },
  gases: readonly string[],
): string => {
  if (kind === 'air') return 'Air, compressed';
  if (kind === 'single') return `Entry of its own: ${gases.join(', ')}`;
  const hazards = [
    ...(division === '2.3' ? ['toxic'] : division === '2.1' ? ['flammable'] : []),
    ...subsidiary.map((each) => subsidiaryNames[each] ?? each),
  ];
  return [`${liquefied ? 'Liquefied' : 'Compressed'} gas`, ...hazards, `not otherwise specified (${gases.join(', ')})`].join(', ');
};

const statements: Readonly<Record<string, string>> = {
  H220: 'Extremely flammable gas',
  H221: 'Flammable gas',
  H232: 'May catch fire by itself in air',
  H270: 'May cause or strengthen fire; oxidiser',
  H280: 'Holds gas under pressure; may burst when heated',
  H330: 'Deadly when breathed in',
  H331: 'Toxic when breathed in',
  H332: 'Harmful when breathed in',
};
export const statement = (code: string): string => statements[code] ?? code;

const precautions: Readonly<Record<string, string>> = {
  P210: 'Keep away from heat, sparks and open flames',
  P220: 'Keep away from clothing and other things that burn',
  P244: 'Keep valves and fittings free of oil and grease',
  P260: 'Do not breathe the gas',
  P377: 'Leaking gas that burns: do not put it out unless the leak can be stopped',
  'P410 + P403': 'Protect from sunlight; store in a well-ventilated place',
};
export const precaution = (code: string): string => precautions[code] ?? code;

export const undecided = (
  reason:
    | { readonly code: 'gas-not-classified'; readonly gas: string }
    | { readonly code: 'fuel-with-oxidiser'; readonly fuelOfLfl: number }
    | { readonly code: 'no-lc50'; readonly gases: readonly string[] },
): string => {
  switch (reason.code) {
    case 'gas-not-classified':
      return `${reason.gas} is in none of the tables of flammability and oxidising power.`;
    case 'fuel-with-oxidiser':
      return `Fuel (${formatNumber(reason.fuelOfLfl * 100, 0)} % of its lower flammable limit) and oxidiser are in it together; ISO 10156 leaves such a gas out of its calculation, and a test decides.`;
    case 'no-lc50':
      return `Harmful without an LC50 here: ${reason.gases.join(', ')}; whether the gas is toxic in transport cannot be told.`;
  }
};

export const ammoniaApart = 'Ammonia is the only fuel, and the lists set it apart: whether the mixture counts as flammable gas (2.1) or not (2.2) cannot be told here.';
export const noEntry = 'No collective entry covers these hazards together.';

export const notUnderPressure = (kilopascal: number): string => `Not a gas under pressure: below ${kilopascal} kPa gauge at 20 °C.`;
export const unitedStates = (kilopascal: number): string => `United States rules count it as Division 2.2 all the same: they begin at ${kilopascal} kPa absolute at 20 °C.`;
export const pressureNotComputed = 'The pressure at 20 °C was not computed; taken as a gas under pressure.';
export const limitNotComputed = 'Its lower flammable limit was not computed; the worse category is suggested.';
export const rangeNotKnown = (limit: number, upTo: number): string =>
  `Lower flammable limit about ${formatNumber(limit, 1)} %, above ${upTo} %; it still counts as flammable when its range is 12 points or wider, and the upper limit of a mixture cannot be calculated.`;
export const ammoniaOnly = 'Ammonia is the only fuel: it stands in category 2, and its own entry has no flammable label.';
export const unstable = (gases: readonly string[]): string => `${gases.join(', ')} may react explosively even without air (H230); whether the mixture does is not judged.`;
export const withoutEstimate = (gases: readonly string[]): string => `Acute toxicity leaves out ${gases.join(', ')}: no figure here.`;
export const toxicity = (lc50: number, estimate: number | null): string =>
  `LC50 (rat, 1 h), which transport uses: ${shownLc50(lc50)}; acute toxicity estimate (4 h), which labels use: ${estimate === null ? 'not known' : shownLc50(estimate)}.`;
export const liquefied = 'The mean critical temperature lies above −50 °C, so the entries for liquefied gas are suggested; the true critical temperature of the mixture decides.';
export const scope = 'Skin, eyes, long-term effects and the environment are not judged; see the safety data sheets of the components.';

function shownLc50(value: number): string {
  return value > 1e6 ? 'above 1 000 000 µmol/mol' : `${formatNumber(value, 0)} µmol/mol`;
}
