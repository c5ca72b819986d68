import {
  parseMass, parseNumberText, parsePressure, parsePressureDifference, parsePressureUnit, parseRelative, parseTemperature, parseVolume, pascal,
} from '../../../units/index.ts';
import { unstatedPressure } from '../../recipe/defaults.ts';
import type { Balance, StockCylinder, StockGauge, StockParent, Thermometer } from '../document.ts';
import { choiceColumn, dateCheck, entryCheck, pressureColumn, purityColumn, textColumn } from './column.ts';
import type { CellCheck } from './column.ts';
import type { Table } from './table.ts';

/*
 * The heads of the five tables are the words of this file. Units stand in the
 * cells, as everywhere: `10 L`, `200 bar gauge`, `0.02 g`.
 */

const temperature = entryCheck(parseTemperature);
const volume = entryCheck(parseVolume);
const mass = entryCheck(parseMass);
const relative = entryCheck(parseRelative);
const massOrShare: CellCheck = (text) => (parseMass(text).ok ? null : relative(text));
/** A temperature difference is typed as one: `0.2 K`. */
const kelvins: CellCheck = (text) => {
  const number = parseNumberText(text);
  if (!number.ok) return { code: 'entry', problem: number.reason };
  const unit = number.value.rest.trim();
  const understood = ['K', '°C'];
  if (unit === '') return { code: 'entry', problem: { code: 'unit-missing', text, understood } };
  if (!understood.includes(unit)) return { code: 'entry', problem: { code: 'unknown-unit', text, unit, understood } };
  return number.value.value < 0 ? { code: 'entry', problem: { code: 'negative', text } } : null;
};
/** A bare number is in the unit of the gauge, whichever that is: only whether it can be read is asked here. */
const fullScale = entryCheck((text) => parsePressure(text, { unit: 'bar', reference: 'gauge', barometer: pascal(101_325) }));

/**
 * Parents: key, name, purity table, pressure, temperature, water capacity,
 * filling (`gas` or `liquefied`), content, lot, expiry, location. The purity
 * table is one cell: `CO 0.5 % ±2 %; O2 < 3 µmol/mol typical; N2 balance`.
 */
export const parentTable: Table<StockParent> = {
  columns: [
    textColumn('key', 'key'),
    textColumn('name', 'name', { also: ['parent', 'gas', 'parent gas'], needed: true }),
    purityColumn('composition', 'purity table', ['purity', 'composition']),
    pressureColumn('pressure', 'pressure', ['supply pressure']),
    textColumn('temperature', 'temperature', { also: ['gas temperature'], check: temperature }),
    textColumn('waterCapacity', 'water capacity', { also: ['volume', 'cylinder volume', 'size'], check: volume }),
    choiceColumn('filling', 'filling', ['gas', 'liquefied'], { otherwise: 'gas' }),
    textColumn('contentMass', 'content', { also: ['content mass', 'mass left'], check: mass }),
    textColumn('lot', 'lot', { also: ['batch', 'certificate'] }),
    textColumn('expiry', 'expiry', { also: ['expires', 'expiry date', 'use by'], check: dateCheck }),
    textColumn('location', 'location', { also: ['place'] }),
  ],
  blank: {
    key: '', name: '', composition: [], pressure: unstatedPressure, temperature: '', waterCapacity: '', filling: 'gas', contentMass: '',
    lot: '', expiry: '', location: '',
  },
  called: ({ name }) => name,
};

/**
 * Cylinders: key, cylinder, material, water capacity, working pressure (15 °C),
 * service pressure (21.1 °C), test pressure, test due, tare, valve outlet, held,
 * conditioned for, location.
 */
export const cylinderTable: Table<StockCylinder> = {
  columns: [
    textColumn('key', 'key'),
    textColumn('id', 'cylinder', { also: ['id', 'number', 'name'], needed: true }),
    choiceColumn('material', 'material', ['aluminium', 'steel', 'rigid']),
    textColumn('waterCapacity', 'water capacity', { also: ['volume', 'size'], needed: true, check: volume }),
    pressureColumn('workingPressure', 'working pressure', ['working pressure at 15 °C']),
    pressureColumn('servicePressure', 'service pressure', ['service pressure at 21.1 °C']),
    pressureColumn('testPressure', 'test pressure'),
    textColumn('testDue', 'test due', { also: ['next test', 'test date'], check: dateCheck }),
    textColumn('tare', 'tare', { also: ['tare mass', 'empty mass'], check: mass }),
    textColumn('valveOutlet', 'valve outlet', { also: ['valve'] }),
    textColumn('held', 'held', { also: ['gases held'] }),
    textColumn('conditionedFor', 'conditioned for'),
    textColumn('location', 'location', { also: ['place'] }),
  ],
  blank: {
    key: '', id: '', material: 'rigid', waterCapacity: '', workingPressure: unstatedPressure, servicePressure: unstatedPressure,
    testPressure: unstatedPressure, testDue: '', tare: '', valveOutlet: '', held: '', conditionedFor: '', location: '',
  },
  called: ({ id }) => id,
};

/**
 * Gauges: key, gauge, unit, reference (`gauge` or `absolute`), full scale,
 * accuracy, accuracy of (`span` or `reading`), resolution, calibrated, location.
 */
export const gaugeTable: Table<StockGauge> = {
  columns: [
    textColumn('key', 'key'),
    textColumn('name', 'gauge', { also: ['name'], needed: true }),
    textColumn('unit', 'unit', { needed: true, check: entryCheck(parsePressureUnit) }),
    choiceColumn('reference', 'reference', ['gauge', 'absolute']),
    textColumn('fullScale', 'full scale', { also: ['range'], needed: true, check: fullScale }),
    textColumn('accuracy', 'accuracy', { needed: true, check: relative }),
    choiceColumn('accuracyOf', 'accuracy of', ['span', 'reading'], { otherwise: 'span' }),
    textColumn('resolution', 'resolution', { needed: true, check: entryCheck((text) => parsePressureDifference(text, 'bar')) }),
    textColumn('calibrated', 'calibrated', { also: ['calibration date'], check: dateCheck }),
    textColumn('location', 'location', { also: ['place'] }),
  ],
  blank: {
    key: '', name: '', unit: '', reference: 'gauge', fullScale: '', accuracy: '', accuracyOf: 'span', resolution: '', calibrated: '',
    location: '',
  },
  called: ({ name }) => name,
};

/** Thermometers: key, thermometer, lowest, highest, accuracy, resolution, calibrated. */
export const thermometerTable: Table<Thermometer> = {
  columns: [
    textColumn('key', 'key'),
    textColumn('name', 'thermometer', { also: ['name'], needed: true }),
    textColumn('lowest', 'lowest', { check: temperature }),
    textColumn('highest', 'highest', { check: temperature }),
    textColumn('accuracy', 'accuracy', { needed: true, check: kelvins }),
    textColumn('resolution', 'resolution', { check: kelvins }),
    textColumn('calibrated', 'calibrated', { also: ['calibration date'], check: dateCheck }),
  ],
  blank: { key: '', name: '', lowest: '', highest: '', accuracy: '', resolution: '', calibrated: '' },
  called: ({ name }) => name,
};

/** Balances: key, balance, capacity, accuracy, accuracy of (`span` or `reading`), resolution, calibrated. */
export const balanceTable: Table<Balance> = {
  columns: [
    textColumn('key', 'key'),
    textColumn('name', 'balance', { also: ['name'], needed: true }),
    textColumn('capacity', 'capacity', { also: ['largest load'], needed: true, check: mass }),
    textColumn('accuracy', 'accuracy', { needed: true, check: massOrShare }),
    choiceColumn('accuracyOf', 'accuracy of', ['span', 'reading'], { otherwise: 'span' }),
    textColumn('resolution', 'resolution', { needed: true, check: mass }),
    textColumn('calibrated', 'calibrated', { also: ['calibration date'], check: dateCheck }),
  ],
  blank: { key: '', name: '', capacity: '', accuracy: '', accuracyOf: 'span', resolution: '', calibrated: '' },
  called: ({ name }) => name,
};
