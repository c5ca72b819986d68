import {
  fromCelsius, kilogram, parseHumidity, parseMass, parsePressure, parsePressureDifference, parsePressureUnit, parseRelative,
  parseTemperature, parseVolume, pascal,
} from '../../units/index.ts';
import type { Conditions, Gauge } from './document.ts';
import type { JobConditions, JobGauge } from './job.ts';
import type { FieldReader } from './reader.ts';

/** Stands where a temperature could not be read; never used, since such a recipe is not planned. */
export const STAND_IN_TEMPERATURE = fromCelsius(20);

/** Air temperatures taken as possible where somebody works (our own choice). */
const COLDEST_ROOM = fromCelsius(-40);
const HOTTEST_ROOM = fromCelsius(60);

/** One gauge in SI: a gauge starts at zero of its own reference, so its span is its full-scale reading. */
export function readGauge(reader: FieldReader, text: Gauge): JobGauge {
  const field = `gauges.${text.key}`;
  const unitEntry = parsePressureUnit(text.unit);
  if (!unitEntry.ok) reader.problems.push({ code: 'entry', field: `${field}.unit`, problem: unitEntry.reason });
  const unit = unitEntry.ok ? unitEntry.value : 'bar';
  const full = parsePressure(text.fullScale, { unit, reference: text.reference, barometer: reader.barometer });
  if (!full.ok) reader.problems.push({ code: 'entry', field: `${field}.fullScale`, problem: full.reason });
  const fullScale = full.ok ? full.value.absolute : pascal(2 * reader.barometer);
  const span = text.reference === 'gauge' ? fullScale - reader.barometer : fullScale;
  reader.positive(`${field}.fullScale`, span);
  const step = parsePressureDifference(text.resolution, unit);
  if (!step.ok) reader.problems.push({ code: 'entry', field: `${field}.resolution`, problem: step.reason });
  const resolution = step.ok ? step.value.difference : 1;
  reader.positive(`${field}.resolution`, resolution);
  const accuracy = reader.read(`${field}.accuracy`, parseRelative(text.accuracy), 0);
  return {
    key: text.key, name: text.name, unit, reference: text.reference, fullScale, span,
    accuracy: text.accuracyOf === 'span' ? accuracy * span : 0,
    accuracyOfReading: text.accuracyOf === 'reading' ? accuracy : 0,
    resolution,
  };
}

/** The day's conditions in SI; the barometer was read before everything else. */
export function readConditions(reader: FieldReader, text: Conditions): JobConditions {
  const balanceResolution = reader.read('conditions.balanceResolution', parseMass(text.balanceResolution), kilogram(0.001));
  reader.positive('conditions.balanceResolution', balanceResolution);
  const concentrationPressure = reader.pressure('conditions.concentrationPressure', text.concentrationPressure, reader.barometer);
  reader.positive('conditions.concentrationPressure', concentrationPressure);
  const roomVolume = reader.optional('conditions.roomVolume', text.roomVolume, parseVolume);
  if (roomVolume !== null) reader.positive('conditions.roomVolume', roomVolume);
  const roomTemperature = reader.read('conditions.roomTemperature', parseTemperature(text.roomTemperature), STAND_IN_TEMPERATURE);
  if (!(roomTemperature >= COLDEST_ROOM && roomTemperature <= HOTTEST_ROOM)) {
    reader.problems.push({ code: 'room-unlikely', field: 'conditions.roomTemperature', lowest: COLDEST_ROOM, highest: HOTTEST_ROOM });
  }
  return {
    barometer: reader.barometer,
    roomTemperature,
    relativeHumidity: reader.read('conditions.relativeHumidity', parseHumidity(text.relativeHumidity), 0),
    roomVolume,
    coldestStorage: reader.optional('conditions.coldestStorage', text.coldestStorage, parseTemperature),
    concentrationTemperature: reader.read(
      'conditions.concentrationTemperature', parseTemperature(text.concentrationTemperature), STAND_IN_TEMPERATURE,
    ),
    concentrationPressure,
    standardPressure: text.standardPressure,
    balanceResolution,
  };
}
