import * as v from 'valibot';
import {
  defaultBatch, defaultConditions, defaultContents, defaultCylinder, defaultRoute, noSplit, unstatedPressure,
} from '../defaults.ts';
import type { Recipe } from '../document.ts';

/**
 * Bounds of a recipe. They are far above anything written at a bench and only
 * keep a hostile file from stopping the program.
 */
export const recipeBounds = { shortText: 200, longText: 2000, lines: 40 } as const;

const short = (description: string) =>
  v.pipe(v.string(), v.maxLength(recipeBounds.shortText), v.description(description));
const long = (description: string) =>
  v.pipe(v.string(), v.maxLength(recipeBounds.longText), v.description(description));
const listOf = <Item extends v.GenericSchema>(item: Item, description: string) =>
  v.pipe(v.array(item), v.maxLength(recipeBounds.lines), v.description(description));

const pressure = (description: string) => v.pipe(
  v.strictObject({
    typed: short('As written on the sheet or the gauge, with its unit: "150 bar", "2000 psi".'),
    reference: v.pipe(
      v.picklist(['gauge', 'absolute']),
      v.description('What the pressure is measured against when the text does not say.'),
    ),
  }),
  v.description(description),
);

const gas = () => short('A gas by name, formula, CAS number or synonym: "carbon dioxide", "CO2".');
const amount = () => short('"5 %", "50 µmol/mol", "balance", or "< 1 µmol/mol" below a limit of detection.');
const compositionLine = v.strictObject({ gas: gas(), amount: amount() });

const purityLine = v.strictObject({
  gas: gas(),
  amount: amount(),
  uncertainty: v.optional(short('Expanded uncertainty (k = 2), "1 %" of the amount or "0.5 µmol/mol".'), ''),
  basis: v.optional(v.picklist(['certified', 'typical']), 'certified'),
});

const order = v.pipe(
  v.strictObject({
    components: listOf(
      v.strictObject({
        gas: gas(),
        amount: amount(),
        tolerance: v.optional(short('Preparation tolerance relative to the amount, "2 %"; empty: none stated.'), ''),
      }),
      'The ordered components; at most one is the balance.',
    ),
    fillPressure: pressure('Pressure of the finished cylinder at the fill temperature.'),
    fillTemperature: short('Gas temperature at which the fill pressure is meant: "20 °C".'),
  }),
  v.description('What is wanted.'),
);

const contents = v.pipe(
  v.strictObject({
    state: v.pipe(
      v.picklist(['evacuated', 'residual', 'not stated']),
      v.description('"not stated" plans from a vacuum and holds the plan.'),
    ),
    pressure: v.optional(pressure('Pressure of the residual or of the vacuum; empty text: not stated.'), defaultContents.pressure),
    temperature: v.optional(short('Gas temperature of the residual.'), defaultContents.temperature),
    composition: v.optional(listOf(compositionLine, 'What the residual is made of.'), []),
  }),
  v.description('What is in the cylinder before the first addition.'),
);

const cylinder = v.pipe(
  v.strictObject({
    id: v.optional(short('Name or number of the cylinder.'), defaultCylinder.id),
    material: v.pipe(
      v.picklist(['aluminium', 'steel', 'rigid']),
      v.description('"rigid" neither stretches with pressure nor expands with temperature.'),
    ),
    waterCapacity: short('"10 L".'),
    workingPressure: v.optional(pressure('As stamped; empty text: not stated.'), defaultCylinder.workingPressure),
    workingPressureTemperature: v.optional(
      short('Temperature the working pressure is marked for: 15 °C (UN) or 21.1 °C (US).'),
      defaultCylinder.workingPressureTemperature,
    ),
    testPressure: v.optional(pressure('As stamped; empty text: not stated.'), defaultCylinder.testPressure),
    pressureExpansion: v.optional(short('Relative volume growth per bar; empty: the material\'s own value.'), ''),
    thermalExpansion: v.optional(short('Linear expansion per kelvin; empty: the material\'s own value.'), ''),
    startReading: v.optional(short('Balance reading before the first addition; empty: only gains are planned.'), ''),
    testDue: v.optional(short('Date of the next test: "2027-03-31".'), ''),
    valveOutlet: v.optional(short('As written on the cylinder.'), ''),
    held: v.optional(short('Gases it has held since it was cleaned.'), ''),
    conditionedFor: v.optional(short('What its inside was prepared for.'), ''),
    contents,
  }),
  v.description('The cylinder to be filled.'),
);

const parent = v.strictObject({
  key: short('Unique within the recipe, used by the steps: "p1".'),
  name: v.optional(short('What the parent is called on the sheet.'), ''),
  composition: listOf(purityLine, 'Purity table; at most one line is "balance".'),
  pressure: v.optional(pressure('Supply pressure; empty text: not stated.'), unstatedPressure),
  temperature: v.optional(short('Gas temperature of that pressure; empty: the room\'s.'), ''),
  waterCapacity: v.optional(short('Of the parent\'s cylinder, "50 L".'), ''),
  filling: v.optional(v.picklist(['gas', 'liquefied']), 'gas'),
  contentMass: v.optional(short('Mass of gas left in a liquefied parent.'), ''),
  lot: v.optional(short('Lot or certificate number.'), ''),
  expiry: v.optional(short('Last day of use: "2027-06-30".'), ''),
  location: v.optional(short('Where it stands.'), ''),
  stock: v.optional(short('Key of the stock entry it was copied from.'), ''),
});

const gauge = v.strictObject({
  key: short('Unique within the recipe: "g1".'),
  name: v.optional(short('What the gauge is called on the sheet.'), ''),
  unit: short('The unit on its face: "bar", "psi".'),
  reference: v.picklist(['gauge', 'absolute']),
  fullScale: short('Upper end of the scale in its own unit and reference.'),
  accuracy: short('Half-width in percent: "0.25 %".'),
  accuracyOf: v.optional(v.picklist(['span', 'reading']), 'span'),
  resolution: short('Smallest readable step in its own unit.'),
  calibrated: v.optional(short('Date of its last calibration.'), ''),
});

const route = v.pipe(
  v.strictObject({
    by: v.optional(v.picklist(['pressure', 'mass', 'pressure and mass']), defaultRoute.by),
    sequence: v.optional(
      v.pipe(
        v.picklist(['best', 'smallest first', 'as listed']),
        v.description('"as listed" adds the parents in the order of the file; "best" lets the checks choose.'),
      ),
      defaultRoute.sequence,
    ),
    split: v.optional(
      v.strictObject({
        parent: short('Key of the parent added in two parts; empty: none.'),
        share: short('Share of its amount that goes in early: "50 %".'),
        before: short('Key of the parent before which it goes in; empty: first.'),
      }),
      noSplit,
    ),
    steps: v.optional(
      listOf(
        v.strictObject({
          parent: short('Key of the parent.'),
          gasTemperature: v.optional(short('Gas temperature when this stop is read; empty: the fill temperature.'), ''),
          gauge: v.optional(short('Key of the gauge; empty: the finest that holds the stop.'), ''),
        }),
        'What is asked of single additions; parents not named take the defaults.',
      ),
      [],
    ),
  }),
  v.description('How the fill is measured and in which order.'),
);

const conditioningStep = v.variant('kind', [
  v.strictObject({ kind: v.literal('lower'), to: pressure('Let out or pump down to this.') }),
  v.strictObject({
    kind: v.literal('purge'),
    parent: short('Key of the parent that purges.'),
    low: pressure('Down to this in each cycle.'),
    high: pressure('Up to this in each cycle.'),
    cycles: short('How many; empty: as many as needed.'),
    wanted: short('Largest fraction of the old gas left; empty: not asked.'),
  }),
  v.strictObject({ kind: v.literal('free'), text: short('Bake, passivation, hold: words for the sheet.') }),
]);

const batch = v.strictObject({
  cylinders: short('How many identical cylinders: "1".'),
  together: v.boolean(),
  boosterInlet: pressure('Lowest pressure a booster draws from; empty text: no booster.'),
});

const laboratoryValue = v.strictObject({
  id: short('What it replaces: "lfl:methane".'),
  value: short('A number in the unit of the published value.'),
  source: short('Where it was read.'),
  date: short('When.'),
});

const conditions = v.pipe(
  v.strictObject({
    barometer: v.optional(short('Barometric pressure of the day.'), defaultConditions.barometer),
    roomTemperature: v.optional(short('Air temperature at the balance.'), defaultConditions.roomTemperature),
    relativeHumidity: v.optional(short('Of the room air.'), defaultConditions.relativeHumidity),
    roomVolume: v.optional(short('Volume of the room; empty: not stated.'), defaultConditions.roomVolume),
    coldestStorage: v.optional(
      short('Coldest temperature the finished cylinder will see; empty: not stated.'),
      defaultConditions.coldestStorage,
    ),
    concentrationTemperature: v.optional(
      short('Temperature at which mass concentrations are given.'),
      defaultConditions.concentrationTemperature,
    ),
    concentrationPressure: v.optional(
      pressure('Pressure at which mass concentrations are given.'),
      defaultConditions.concentrationPressure,
    ),
    standardPressure: v.optional(v.picklist(['1 bar', '1 atm']), defaultConditions.standardPressure),
    balanceResolution: v.optional(short('Smallest step the balance shows.'), defaultConditions.balanceResolution),
    balance: v.optional(short('Which balance: words for the sheet.'), ''),
    thermometer: v.optional(short('Which thermometer: words for the sheet.'), ''),
  }),
  v.description('Conditions of the day and reference states.'),
);

const override = v.strictObject({
  finding: short('Id of the finding that it answers.'),
  figure: short('The figure shown then; when it changes the decision no longer stands.'),
  name: short('Who decided.'),
  reason: long('Why.'),
});

/** A recipe as files and storage hold it: unknown fields refused, optional ones filled with the defaults. */
export const recipeSchema = v.strictObject({
  name: short('What the recipe is called.'),
  note: v.optional(long('Free text.'), ''),
  order,
  cylinder,
  parents: listOf(parent, 'The gases to add, in the technician\'s own order.'),
  gauges: v.optional(listOf(gauge, 'The pressure gauges at the filling place.'), []),
  conditioning: v.optional(listOf(conditioningStep, 'What is done to the cylinder before the first addition.'), []),
  route: v.optional(route, defaultRoute as v.InferInput<typeof route>),
  batch: v.optional(batch, defaultBatch),
  conditions: v.optional(conditions, {}),
  values: v.optional(
    v.pipe(v.array(laboratoryValue), v.maxLength(500), v.description('The laboratory\'s own limits and coefficients.')), [],
  ),
  overrides: v.optional(listOf(override, 'Decisions of named persons on holds.'), []),
});

/** Newest version of the file format. */
export const recipeFileVersion = 2;

/** The file that people exchange. */
export const recipeFileSchema = v.pipe(
  v.strictObject({
    $schema: v.optional(short('For editors that check while one writes; not read.')),
    format: v.literal('fillwright-recipe'),
    version: v.literal(recipeFileVersion),
    program: v.optional(short('The program and version that wrote the file.'), ''),
    recipe: recipeSchema,
  }),
  v.title('Fillwright recipe'),
  v.description('A recipe for filling one calibration-gas cylinder. Quantities are texts with their units.'),
);

type Frozen<Value> = Value extends object ? { readonly [Field in keyof Value]: Frozen<Value[Field]> } : Value;
type Filled<Value> = Value extends object ? { readonly [Field in keyof Value]-?: Filled<Value[Field]> } : Value;
/** Each way, and once more with optional fields made required, since those slip through assignment. */
type Same<Left, Right> = [Frozen<Left>, Filled<Left>] extends [Frozen<Right>, Filled<Right>]
  ? [Frozen<Right>, Filled<Right>] extends [Frozen<Left>, Filled<Left>] ? true : false
  : false;

/** Fails to compile when the schema and `Recipe` drift apart. */
export const schemaIsRecipe: Same<v.InferOutput<typeof recipeSchema>, Recipe> = true;
