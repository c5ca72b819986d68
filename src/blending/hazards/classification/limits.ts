import type { PublishedValue } from '../../values/value.ts';

/** Limits of the suggested class that no rule has; see the rules for the others. */

const ghs = { gas: null, source: 'Globally Harmonized System and CLP, chapters 2.2 and 2.5', trust: 'seen' } as const;

export const underPressureFrom: PublishedValue = {
  ...ghs, id: 'gas-under-pressure', quantity: 'Pressure at 20 °C from which a gas is a gas under pressure', value: 200, unit: 'kPa gauge',
};
export const unitedStatesFrom: PublishedValue = {
  id: 'division-2.2-from', quantity: 'Pressure at 20 °C from which a gas is Division 2.2 in the United States', gas: null, value: 280, unit: 'kPa absolute',
  source: '49 CFR 173.115(b)', trust: 'seen',
};
export const category1BAbove: PublishedValue = {
  ...ghs, id: 'category-1b-above', quantity: 'Lower flammable limit above which a flammable gas is category 1B', value: 6, unit: '%',
};
export const ignitableUpTo: PublishedValue = {
  ...ghs, id: 'ignitable-up-to', quantity: 'Content in air up to which a gas that is ignitable is flammable in transport', value: 13, unit: '%',
};
export const pyrophoricFrom: PublishedValue = {
  ...ghs, id: 'pyrophoric-from', quantity: 'Content above which a gas that lights by itself makes the mixture so', value: 1, unit: '%',
};
export const airOxygenFrom: PublishedValue = {
  id: 'air-oxygen-from', quantity: 'Oxygen content from which nitrogen with oxygen is called air', gas: null, value: 19.5, unit: '%',
  source: 'Own choice', trust: 'common practice, no source',
};

/** Gases with the statement H232 (from memory). */
export const pyrophoricGases: ReadonlySet<string> = new Set(['silane']);
/** Gases with the statement H230: may react explosively even without air (from memory). */
export const chemicallyUnstableGases: ReadonlySet<string> = new Set(['acetylene', 'ethylene oxide']);

export const values: readonly PublishedValue[] = [
  underPressureFrom, unitedStatesFrom, category1BAbove, ignitableUpTo, pyrophoricFrom, airOxygenFrom,
];
