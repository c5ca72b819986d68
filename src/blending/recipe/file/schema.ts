import * as v from 'valibot';
import { defaultConditions, defaultContents, defaultCylinder, defaultRoute, unstatedPressure } from '../defaults.ts';
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
    pressure: v.optional(pressure('Pressure of the residual or of the vacuum; empty text: not stated.'), unstatedPressure),
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
    contents,
  }),
  v.description('The cylinder to be filled.'),
);

const parent = v.strictObject({
  key: short('Unique within the recipe, used by the steps: "p1".'),
  name: v.optional(short('What the parent is called on the sheet.'), ''),
  composition: listOf(compositionLine, 'Purity table; at most one line is "balance".'),
  pressure: v.optional(pressure('Supply pressure; empty text: not stated.'), unstatedPressure),
});

const gauge = v.strictObject({
  key: short('Unique within the recipe: "g1".'),
  name: v.optional(short('What the gauge is called on the sheet.'), ''),
  unit: short('The unit on its face: "bar", "psi".'),
  reference: v.picklist(['gauge', 'absolute']),
  fullScale: short('Upper end of the scale in its own unit and reference.'),
  accuracy: short('Percent of span: "0.25 %".'),
  resolution: short('Smallest readable step in its own unit.'),
});

const route = v.pipe(
  v.strictObject({
    by: v.optional(v.picklist(['pressure', 'mass', 'pressure and mass']), defaultRoute.by),
    sequence: v.optional(
      v.pipe(
        v.picklist(['smallest first', 'as listed']),
        v.description('"as listed" adds the parents in the order of the file.'),
      ),
      defaultRoute.sequence,
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
  route: v.optional(route, defaultRoute as v.InferInput<typeof route>),
  conditions: v.optional(conditions, {}),
  overrides: v.optional(listOf(override, 'Decisions of named persons on holds.'), []),
});

/** First and so far only version of the file format. */
export const recipeFileVersion = 1;

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
