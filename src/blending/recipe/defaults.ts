import type {
  Batch, CompositionLine, Conditions, Contents, Cylinder, Parent, PressureText, PurityLine, Recipe, Route, Split,
} from './document.ts';

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
  balance: '',
  thermometer: '',
};

/** Every parent goes in whole. */
export const noSplit: Split = { parent: '', share: '50 %', before: '' };

export const defaultRoute: Route = { by: 'pressure', sequence: 'smallest first', split: noSplit, steps: [] };

/** One cylinder, without a booster. */
export const defaultBatch: Batch = { cylinders: '1', together: false, boosterInlet: unstatedPressure };

/** A parent of which nothing is known but what `parentNamed` is told. */
const unknownParent: Omit<Parent, 'key' | 'name'> = {
  composition: [],
  pressure: unstatedPressure,
  temperature: '',
  waterCapacity: '',
  filling: 'gas',
  contentMass: '',
  lot: '',
  expiry: '',
  location: '',
  stock: '',
};

/** A purity table from bare lines: certified, without uncertainties. */
export function purityTable(lines: readonly CompositionLine[]): readonly PurityLine[] {
  return lines.map(({ gas, amount }) => ({ gas, amount, uncertainty: '', basis: 'certified' }));
}

/** A parent with what is said of it, and everything else not stated. */
export function parentNamed(key: string, name: string, said: Partial<Omit<Parent, 'key' | 'name'>> = {}): Parent {
  return { ...unknownParent, ...said, key, name };
}

/** Nothing is said about the contents: the plan is held until somebody does. */
export const defaultContents: Contents = {
  state: 'not stated',
  // A vacuum is never meant as gauge.
  pressure: { typed: '', reference: 'absolute' },
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
  testDue: '',
  valveOutlet: '',
  held: '',
  conditionedFor: '',
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
  conditioning: [],
  route: defaultRoute,
  batch: defaultBatch,
  conditions: defaultConditions,
  values: [],
  overrides: [],
};
