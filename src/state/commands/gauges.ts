import type { Gauge, Recipe } from '../../blending/index.ts';
import { freshKey, patchKey, patchWords, replaceKeyed, type Command } from '../command.ts';

const gaugeWords = {
  name: 'name',
  unit: 'unit',
  reference: 'gauge or absolute',
  fullScale: 'full scale',
  accuracy: 'accuracy',
  accuracyOf: 'accuracy of span or reading',
  resolution: 'resolution',
  calibrated: 'calibration date',
};

/** A gauge without its key; accuracy is of the span and the calibration not stated unless said. */
export type NewGauge = Omit<Gauge, 'key' | 'accuracyOf' | 'calibrated'> & Partial<Gauge>;

/** Adds a pressure gauge at the end under a fresh key. */
export function addGauge(gauge: NewGauge): Command {
  return {
    label: () => 'added gauge',
    merge: null,
    apply: (recipe) => ({ ...recipe, gauges: [...recipe.gauges, { accuracyOf: 'span', calibrated: '', ...gauge, key: freshKey(recipe.gauges, 'g') }] }),
  };
}

/** Changes fields of one gauge. */
export function editGauge(key: string, patch: Partial<Omit<Gauge, 'key'>>): Command {
  return {
    label: (before) => `${gaugeName(before, key)} ${patchWords(patch, gaugeWords)}`,
    merge: patchKey(`gauge.${key}`, patch),
    apply: (recipe) => ({
      ...recipe,
      gauges: replaceKeyed(recipe.gauges, key, (gauge) => ({ ...gauge, ...patch })),
    }),
  };
}

/** Removes one gauge; steps that asked for it go back to the finest gauge that holds their stop. */
export function removeGauge(key: string): Command {
  return {
    label: (before) => `removed ${gaugeName(before, key)}`,
    merge: null,
    apply: (recipe) => ({
      ...recipe,
      gauges: recipe.gauges.filter((gauge) => gauge.key !== key),
      route: {
        ...recipe.route,
        steps: recipe.route.steps
          .map((step) => (step.gauge === key ? { ...step, gauge: '' } : step))
          .filter((step) => step.gauge !== '' || step.gasTemperature !== ''),
      },
    }),
  };
}

function gaugeName(recipe: Recipe, key: string): string {
  const name = recipe.gauges.find((gauge) => gauge.key === key)?.name.trim() ?? '';
  return name === '' ? 'gauge' : name;
}
