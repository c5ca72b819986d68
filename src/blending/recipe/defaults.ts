import type { Conditions, Contents, Cylinder, PressureText, Recipe, Route } from './document.ts';

/** A pressure that was not stated. */
export const unstatedPressure: PressureText = { typed: '', reference: 'gauge' };

/**
 * Conditions assumed until somebody says otherwise. The concentration state
 * (20 °C, 101.325 kPa) is the one commonly used for occupational air
 * measurements; the barometer is the standard atmosphere. Common practice.
 */
export const defaultConditions: Conditions = {
  barometer: '1013.25 hPa',
  roomTemperature: '20 °C',
  relativeHumidity: '50 %',
  roomVolume: '',
  coldestStorage: '',
  concentrationTemperature: '20 °C',
  concentrationPressure: { typed: '101.325 kPa', reference: 'absolute' },
  standardPressure: '1 bar',
  balanceResolution: '0.1 g',
};

export const defaultRoute: Route = { by: 'pressure', sequence: 'smallest first', steps: [] };

/** Nothing is said about the contents: the plan is held until somebody does. */
export const defaultContents: Contents = {
  state: 'not stated',
  pressure: unstatedPressure,
  temperature: '20 °C',
  composition: [],
};

export const defaultCylinder: Cylinder = {
  id: '',
  material: 'aluminium',
  waterCapacity: '',
  workingPressure: unstatedPressure,
  workingPressureTemperature: '15 °C',
  testPressure: unstatedPressure,
  pressureExpansion: '',
  thermalExpansion: '',
  startReading: '',
  contents: defaultContents,
};

/** A recipe before anything is typed: what a new recipe starts from. */
export const emptyRecipe: Recipe = {
  name: 'Untitled recipe',
  note: '',
  order: { components: [], fillPressure: unstatedPressure, fillTemperature: '20 °C' },
  cylinder: defaultCylinder,
  parents: [],
  gauges: [],
  route: defaultRoute,
  conditions: defaultConditions,
  overrides: [],
};
