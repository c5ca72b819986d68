import type { Conditions } from '../../blending/index.ts';
import { patchKey, patchWords, type Command } from '../command.ts';

const conditionsWords = {
  barometer: 'barometer',
  roomTemperature: 'room temperature',
  relativeHumidity: 'relative humidity',
  roomVolume: 'room volume',
  coldestStorage: 'coldest storage',
  concentrationTemperature: 'concentration temperature',
  concentrationPressure: 'concentration pressure',
  standardPressure: 'standard pressure',
  balance: 'balance',
  thermometer: 'thermometer',
  balanceResolution: 'balance resolution',
};

/** Changes conditions of the day and reference states. */
export function editConditions(patch: Partial<Conditions>): Command {
  return {
    label: () => patchWords(patch, conditionsWords),
    merge: patchKey('conditions', patch),
    apply: (recipe) => ({ ...recipe, conditions: { ...recipe.conditions, ...patch } }),
  };
}
