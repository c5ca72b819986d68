import { ok, parseAmountFraction, parseMass, parseTemperature, parseVolume } from '../../units/index.ts';
import type { Kelvin } from '../../units/index.ts';
import type { GasId } from '../../thermo/index.ts';
import type { ReadComposition } from './composition.ts';
import type { Parent, Recipe } from './document.ts';
import { STAND_IN_TEMPERATURE } from './instruments.ts';
import type { JobParent } from './job.ts';
import type { FieldReader } from './reader.ts';

/** Amount fractions of a composition, aligned with `gases`. */
export function fractionsOf(composition: ReadComposition, gases: readonly GasId[]): Float64Array {
  const fractions = new Float64Array(gases.length);
  for (const part of composition.parts) fractions[gases.indexOf(part.gas)]! += part.fraction;
  return fractions;
}

/** A size as a share of the amount, `1 %`, or as an amount fraction. */
function parseSize(text: string) {
  const entry = parseAmountFraction(text);
  return entry.ok ? ok({ si: Number(entry.value.fraction) }) : entry;
}

/** One parent in SI with its purity table as already read. Problems go to the reader. */
export function readParent(
  reader: FieldReader, recipe: Pick<Recipe, 'route' | 'conditions'>, parent: Parent, supply: ReadComposition,
  gases: readonly GasId[], fillTemperature: Kelvin,
): JobParent {
  const field = `parents.${parent.key}`;
  const choice = recipe.route.steps.find((step) => step.parent === parent.key);
  if (parent.composition.length === 0) reader.problems.push({ code: 'no-components', field: `${field}.composition` });
  parent.composition.forEach(({ uncertainty }, line) => {
    reader.optional(`${field}.composition.${String(line)}.uncertainty`, uncertainty, parseSize);
  });
  const waterCapacity = reader.optional(`${field}.waterCapacity`, parent.waterCapacity, parseVolume);
  if (waterCapacity !== null) reader.positive(`${field}.waterCapacity`, waterCapacity);
  // The room's temperature has its own field, where a text that cannot be read is said.
  const room = parseTemperature(recipe.conditions.roomTemperature);
  return {
    key: parent.key,
    name: parent.name,
    fractions: fractionsOf(supply, gases),
    belowLimit: supply.parts.filter((part) => part.isLimit).map((part) => gases.indexOf(part.gas)),
    purityStated: parent.composition.length > 1,
    pressure: reader.optionalPressure(`${field}.pressure`, parent.pressure),
    temperature: reader.optional(`${field}.temperature`, parent.temperature, parseTemperature)
      ?? (room.ok ? room.value.si : STAND_IN_TEMPERATURE),
    waterCapacity,
    filling: parent.filling,
    contentMass: reader.optional(`${field}.contentMass`, parent.contentMass, parseMass),
    gasTemperature:
      reader.optional(`route.steps.${parent.key}.gasTemperature`, choice?.gasTemperature ?? '', parseTemperature) ?? fillTemperature,
    gauge: choice === undefined || choice.gauge === '' ? null : choice.gauge,
  };
}
