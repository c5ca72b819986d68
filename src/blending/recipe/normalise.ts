import {
  cubicMetre, fail, fraction, kelvin, ok, parseExpansion, parseMass, parsePressure, parseRelative, parseTemperature,
  parseThermalExpansion, parseVolume, pascal,
} from '../../units/index.ts';
import type { Outcome } from '../../units/index.ts';
import type { GasId } from '../../thermo/index.ts';
import type { Recipe } from './document.ts';
import type { Job, JobComponent, JobContents, JobCylinder } from './job.ts';
import { fractionsOf, readParent } from './parent.ts';
import { readConditions, readGauge, STAND_IN_TEMPERATURE } from './instruments.ts';
import { MATERIAL_EXPANSION, REFERENCE_TEMPERATURE } from './material.ts';
import { readComposition } from './composition.ts';
import { readConditioning } from './conditioning.ts';
import type { ReadComposition } from './composition.ts';
import type { RecipeProblem } from './problem.ts';
import { FieldReader } from './reader.ts';
import { readBatch, readSplit } from './route.ts';
import { readLaboratoryValues } from './laboratory-values.ts';

/** One atmosphere, used only while the barometer's own text cannot be read. */
const STANDARD_ATMOSPHERE = pascal(101_325);

/** Air pressures taken as possible, absolute: above any inhabited height, and above any record at sea level. */
const LOWEST_BAROMETER = pascal(50_000);
const HIGHEST_BAROMETER = pascal(110_000);

/** All problems of a recipe together. */
export interface RecipeProblems {
  readonly code: 'recipe-problems';
  readonly problems: readonly RecipeProblem[];
}

/**
 * Reads every text of a recipe into SI numbers. Fails with all problems at
 * once, each naming its field; succeeds with a `Job` that can be planned.
 */
export function normaliseRecipe(recipe: Recipe): Outcome<Job, RecipeProblems> {
  const barometerText = recipe.conditions.barometer;
  const barometer = parsePressure(barometerText, { unit: 'hPa', reference: 'absolute' });
  const reader = new FieldReader(barometer.ok ? barometer.value.absolute : STANDARD_ATMOSPHERE);
  if (!barometer.ok) reader.problems.push({ code: 'entry', field: 'conditions.barometer', problem: barometer.reason });
  else if (!(reader.barometer >= LOWEST_BAROMETER && reader.barometer <= HIGHEST_BAROMETER)) {
    reader.problems.push({ code: 'barometer-unlikely', field: 'conditions.barometer', lowest: LOWEST_BAROMETER, highest: HIGHEST_BAROMETER });
  }

  const ordered = readComposition(reader, 'order.components', recipe.order.components, false);
  if (recipe.order.components.length === 0) reader.problems.push({ code: 'no-components', field: 'order.components' });
  if (recipe.parents.length === 0) reader.problems.push({ code: 'no-parents', field: 'parents' });
  const supplies = recipe.parents.map((parent) =>
    readComposition(reader, `parents.${parent.key}.composition`, parent.composition, true));
  const isResidual = recipe.cylinder.contents.state === 'residual';
  const left: ReadComposition = isResidual
    ? readComposition(reader, 'cylinder.contents.composition', recipe.cylinder.contents.composition, false)
    : { parts: [] };
  noteRepeatedKeys(reader, 'parents', recipe.parents.map((parent) => parent.key));
  noteRepeatedKeys(reader, 'gauges', recipe.gauges.map((gauge) => gauge.key));

  const gases = gatherGases([ordered, ...supplies, left]);
  const fillTemperature = reader.read('order.fillTemperature', parseTemperature(recipe.order.fillTemperature), STAND_IN_TEMPERATURE);
  const fillPressure = reader.pressure('order.fillPressure', recipe.order.fillPressure, reader.barometer);
  reader.positive('order.fillPressure', fillPressure);
  const job: Job = {
    gases,
    order: { components: components(reader, recipe, ordered, gases), fillPressure, fillTemperature },
    cylinder: cylinder(reader, recipe, left, gases),
    parents: recipe.parents.map((parent, index) => readParent(reader, recipe, parent, supplies[index]!, gases, fillTemperature)),
    gauges: recipe.gauges.map((gauge) => readGauge(reader, gauge)),
    conditioning: readConditioning(reader, recipe.conditioning, recipe.parents),
    by: recipe.route.by,
    split: readSplit(reader, recipe),
    batch: readBatch(reader, recipe.batch),
    conditions: readConditions(reader, recipe.conditions),
    overrides: recipe.overrides,
    values: readLaboratoryValues(reader, recipe.values),
  };
  return reader.problems.length === 0 ? ok(job) : fail({ code: 'recipe-problems', problems: reader.problems });
}

function noteRepeatedKeys(reader: FieldReader, field: string, keys: readonly string[]): void {
  const repeated = keys.find((key, index) => keys.indexOf(key) !== index);
  if (repeated !== undefined) reader.problems.push({ code: 'key-repeated', field, key: repeated });
}

/** Every gas that occurs, ordered components first, each once. */
function gatherGases(compositions: readonly ReadComposition[]): GasId[] {
  return [...new Set(compositions.flatMap(({ parts }) => parts.map((part) => part.gas)))];
}

function components(reader: FieldReader, recipe: Recipe, ordered: ReadComposition, gases: readonly GasId[]): JobComponent[] {
  return ordered.parts.map((part) => ({
    gas: gases.indexOf(part.gas),
    nominal: fraction(part.fraction),
    tolerance: reader.optional(
      `order.components.${String(part.line)}.tolerance`, recipe.order.components[part.line]!.tolerance, parseRelative,
    ),
    isBalance: part.isBalance,
  }));
}

function cylinder(reader: FieldReader, recipe: Recipe, left: ReadComposition, gases: readonly GasId[]): JobCylinder {
  const { cylinder: text } = recipe;
  const own = MATERIAL_EXPANSION[text.material];
  const waterCapacity = reader.read('cylinder.waterCapacity', parseVolume(text.waterCapacity), cubicMetre(1));
  reader.positive('cylinder.waterCapacity', waterCapacity);
  return {
    id: text.id,
    material: text.material,
    waterCapacity,
    referenceTemperature: REFERENCE_TEMPERATURE,
    pressureExpansion: reader.optional('cylinder.pressureExpansion', text.pressureExpansion, parseExpansion) ?? own.pressure,
    thermalExpansion: reader.optional('cylinder.thermalExpansion', text.thermalExpansion, parseThermalExpansion) ?? own.thermal,
    workingPressure: reader.optionalPressure('cylinder.workingPressure', text.workingPressure),
    workingPressureTemperature:
      reader.optional('cylinder.workingPressureTemperature', text.workingPressureTemperature, parseTemperature) ?? kelvin(288.15),
    testPressure: reader.optionalPressure('cylinder.testPressure', text.testPressure),
    startReading: reader.optional('cylinder.startReading', text.startReading, parseMass),
    contents: contents(reader, recipe, left, gases),
  };
}

/** A vacuum still has a pressure; its gas is taken as the balance of the order, of which it is a vanishing part. */
function contents(reader: FieldReader, recipe: Recipe, left: ReadComposition, gases: readonly GasId[]): JobContents {
  const { contents: text } = recipe.cylinder;
  const fractions = fractionsOf(left, gases);
  if (text.state === 'not stated') return { state: text.state, pressure: pascal(0), temperature: STAND_IN_TEMPERATURE, fractions };
  const stated = text.state === 'evacuated' ? reader.optionalPressure('cylinder.contents.pressure', text.pressure) : null;
  const pressure = text.state === 'evacuated'
    ? (stated ?? pascal(0))
    : reader.pressure('cylinder.contents.pressure', text.pressure, pascal(0));
  if (text.state === 'residual') reader.positive('cylinder.contents.pressure', pressure);
  if (text.state === 'residual' && recipe.cylinder.contents.composition.length === 0) {
    reader.problems.push({ code: 'no-components', field: 'cylinder.contents.composition' });
  }
  const temperature = reader.optional('cylinder.contents.temperature', text.temperature, parseTemperature);
  const fillTemperature = parseTemperature(recipe.order.fillTemperature);
  if (text.state === 'evacuated') {
    const balance = balanceGas(recipe, reader);
    if (balance !== null && gases.includes(balance)) fractions[gases.indexOf(balance)] = 1;
  }
  return {
    state: text.state, pressure, fractions,
    temperature: temperature ?? (fillTemperature.ok ? fillTemperature.value.si : STAND_IN_TEMPERATURE),
  };
}

function balanceGas(recipe: Recipe, reader: FieldReader): GasId | null {
  const silent = new FieldReader(reader.barometer);
  return readComposition(silent, '', recipe.order.components, false).parts.find((part) => part.isBalance)?.gas ?? null;
}
