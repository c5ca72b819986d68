import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../src/blending/index.ts';
import { addGauge, addParent, editGauge, editStep, removeGauge } from '../../../src/state/index.ts';

const gauge = {
  name: 'Panel', unit: 'bar', reference: 'gauge', fullScale: '250', accuracy: '0.25 %', resolution: '0.1',
} as const;
const parent = { name: 'Argon', composition: [], pressure: { typed: '', reference: 'gauge' } } as const;
const recipe = [addGauge(gauge), addGauge(gauge), addParent(parent), addParent(parent)]
  .reduce((made, command) => command.apply(made), emptyRecipe);

describe('gauge commands', () => {
  it('add under fresh keys and edit one', () => {
    expect(recipe.gauges.map(({ key }) => key)).toEqual(['g1', 'g2']);
    const command = editGauge('g2', { fullScale: '10' });
    expect(command.apply(recipe).gauges).toMatchObject([{ key: 'g1', ...gauge, accuracyOf: 'span' }, { key: 'g2', ...gauge, fullScale: '10' }]);
    expect(command.label(recipe)).toBe('Panel full scale');
  });

  it('remove one and free the steps that asked for it', () => {
    const chosen = [editStep('p1', { gauge: 'g2' }), editStep('p2', { gauge: 'g2', gasTemperature: '25 °C' })]
      .reduce((made, command) => command.apply(made), recipe);
    const removed = removeGauge('g2').apply(chosen);
    expect(removed.gauges.map(({ key }) => key)).toEqual(['g1']);
    expect(removed.route.steps).toEqual([{ parent: 'p2', gasTemperature: '25 °C', gauge: '' }]);
    expect(removeGauge('g9').label(recipe)).toBe('removed gauge');
  });
});
