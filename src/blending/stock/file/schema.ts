import * as v from 'valibot';
import { unstatedPressure } from '../../recipe/defaults.ts';
import { recipeBounds, recipeSchema } from '../../recipe/file/schema.ts';
import type { Stock } from '../document.ts';

/** Bounds of a stock: far above any rack, and only there to keep a hostile file from stopping the program. */
export const stockBounds = { lines: 500 } as const;

const short = (description: string) =>
  v.pipe(v.string(), v.maxLength(recipeBounds.shortText), v.description(description));
const listOf = <Item extends v.GenericSchema>(item: Item, description: string) =>
  v.pipe(v.array(item), v.maxLength(stockBounds.lines), v.description(description));
const pressure = (description: string) =>
  v.optional(v.pipe(recipeSchema.entries.order.entries.fillPressure, v.description(description)), unstatedPressure);
const location = v.optional(short('Where it stands.'), '');
const calibrated = v.optional(short('Date of its last calibration: "2026-05-11".'), '');
const accuracyOf = v.optional(v.picklist(['span', 'reading']), 'span');

/** A parent is written as in a recipe; only where it came from is not asked. */
const parent = v.omit(recipeSchema.entries.parents.item, ['stock']);

const cylinder = v.strictObject({
  key: short('Unique in the stock: "b-0417".'),
  id: short('Name or number of the cylinder.'),
  material: recipeSchema.entries.cylinder.entries.material,
  waterCapacity: short('"10 L".'),
  workingPressure: pressure('As marked for 15 °C (UN); empty text: not marked.'),
  servicePressure: pressure('As marked for 21.1 °C (US); empty text: not marked.'),
  testPressure: pressure('As stamped; empty text: not stated.'),
  testDue: v.optional(short('Date of the next test: "2027-03-31".'), ''),
  tare: v.optional(short('Stamped mass of the empty cylinder: "14.82 kg".'), ''),
  valveOutlet: v.optional(short('As written on the cylinder.'), ''),
  held: v.optional(short('Gases it has held since it was cleaned.'), ''),
  conditionedFor: v.optional(short('What its inside was prepared for.'), ''),
  location,
});

const gauge = v.strictObject({ ...recipeSchema.entries.gauges.wrapped.item.entries, location });

const thermometer = v.strictObject({
  key: short('Unique in the stock: "t1".'),
  name: v.optional(short('What it is called on the sheet.'), ''),
  lowest: v.optional(short('Lowest reading: "-20 °C".'), ''),
  highest: v.optional(short('Highest reading: "60 °C".'), ''),
  accuracy: short('Half-width: "0.2 K".'),
  resolution: v.optional(short('Smallest readable step: "0.1 K".'), ''),
  calibrated,
});

const balance = v.strictObject({
  key: short('Unique in the stock: "w1".'),
  name: v.optional(short('What it is called on the sheet.'), ''),
  capacity: short('Largest load: "32 kg".'),
  accuracy: short('Half-width, a mass "0.02 g" or a share "0.001 %".'),
  accuracyOf,
  resolution: short('Smallest step it shows: "0.01 g".'),
  calibrated,
});

/** A stock as files and storage hold it: unknown fields refused, optional ones filled with their defaults. */
export const stockSchema = v.strictObject({
  parents: v.optional(listOf(parent, 'The parent gases on the rack.'), []),
  cylinders: v.optional(listOf(cylinder, 'The cylinders that can be filled.'), []),
  gauges: v.optional(listOf(gauge, 'The pressure gauges.'), []),
  thermometers: v.optional(listOf(thermometer, 'The thermometers.'), []),
  balances: v.optional(listOf(balance, 'The balances.'), []),
  values: recipeSchema.entries.values,
});

/** Newest version of the file format. */
export const stockFileVersion = 1;

/** The file that people exchange. */
export const stockFileSchema = v.pipe(
  v.strictObject({
    $schema: v.optional(short('For editors that check while one writes; not read.')),
    format: v.literal('fillwright-stock'),
    version: v.literal(stockFileVersion),
    program: v.optional(short('The program and version that wrote the file.'), ''),
    stock: stockSchema,
  }),
  v.title('Fillwright stock'),
  v.description('What a laboratory has to fill calibration-gas cylinders with. Quantities are texts with their units.'),
);

type Frozen<Value> = Value extends object ? { readonly [Field in keyof Value]: Frozen<Value[Field]> } : Value;
type Filled<Value> = Value extends object ? { readonly [Field in keyof Value]-?: Filled<Value[Field]> } : Value;
type Same<Left, Right> = [Frozen<Left>, Filled<Left>] extends [Frozen<Right>, Filled<Right>]
  ? [Frozen<Right>, Filled<Right>] extends [Frozen<Left>, Filled<Left>] ? true : false
  : false;

/** Fails to compile when the schema and `Stock` drift apart. */
export const schemaIsStock: Same<v.InferOutput<typeof stockSchema>, Stock> = true;
