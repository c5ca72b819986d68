import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PurityLine, StockCylinder, StockParent } from '../../src/blending/index.ts';
import { readCells } from '../../src/blending/stock/csv/cells.ts';
import {
  balanceTable, cylinderTable, decodeStock, demoStock, encodeStock, gaugeTable, parentTable, purityText, readParentsPaste, readPurityPaste, readPurityText,
  readTable, thermometerTable, writeTable,
} from '../../src/blending/stock/tools.ts';
import type { Delimiter, TableReading } from '../../src/blending/stock/tools.ts';

/** Any text that a cell may hold: quotes, separators, line ends, formula signs; no spaces around, as cells are trimmed. */
const text = fc.oneof(
  fc.string({ unit: fc.constantFrom('a', 'é', '₂', '"', ',', ';', '\t', '\n', '\r\n', '\'', '=', '+', '-', '@', '1', ' ', '%', '±', '<'), maxLength: 12 }),
  fc.string({ unit: 'grapheme', maxLength: 12 }),
).map((each) => each.trim());
const words = text.filter((each) => each !== '');
const delimiter = fc.constantFrom<Delimiter>(',', ';', '\t');

const pressure = fc.record({
  typed: fc.constantFrom('', '200 bar', '1,5 bar', '2000 psi', '0.01 mbar', 'much', '7'), reference: fc.constantFrom('gauge', 'absolute'),
});
const line: fc.Arbitrary<PurityLine> = fc.record({
  gas: fc.constantFrom('CO', 'N₂', 'n-C₄H₁₀', '1,3-butadiene', 'carbon monoxide', 'R134a', '7782-44-7'),
  amount: fc.constantFrom('balance', '0.5 %', '0,5 %', '< 3 µmol/mol', '≤ 1 nmol/mol', '1e-6 mol/mol', '40 ppm'),
  uncertainty: fc.constantFrom('', '2 %', '0.5 µmol/mol'),
  basis: fc.constantFrom('certified', 'typical'),
});

const parent: fc.Arbitrary<StockParent> = fc.record({
  key: words, name: words, composition: fc.array(line, { maxLength: 6 }), pressure, temperature: text, waterCapacity: text,
  filling: fc.constantFrom('gas', 'liquefied'), contentMass: text, lot: text, expiry: text, location: text,
});
const cylinder: fc.Arbitrary<StockCylinder> = fc.record({
  key: words, id: text, material: fc.constantFrom('aluminium', 'steel', 'rigid'), waterCapacity: text, workingPressure: pressure, servicePressure: pressure,
  testPressure: pressure, testDue: text, tare: text, valveOutlet: text, held: text, conditionedFor: text, location: text,
});
const listOf = <Entry extends { readonly key: string }>(entry: fc.Arbitrary<Entry>) => fc.uniqueArray(entry, { selector: ({ key }) => key, maxLength: 5 });

/** The text taken as each of the five tables. */
function readAs(any: string): readonly TableReading<{ readonly key: string }>[] {
  return [readTable(parentTable, any), readTable(cylinderTable, any), readTable(gaugeTable, any), readTable(thermometerTable, any), readTable(balanceTable, any)];
}

describe('tables', () => {
  it('come back as they were written, whatever stands in the cells', () => {
    fc.assert(fc.property(listOf(parent), listOf(cylinder), delimiter, (parents, cylinders, separator) => {
      const read = readTable(parentTable, writeTable(parentTable, parents, separator));
      expect(read.entries).toEqual(parents);
      expect(read.unread).toEqual([]);
      expect(readTable(cylinderTable, writeTable(cylinderTable, cylinders, separator)).entries).toEqual(cylinders);
    }), { numRuns: 300, seed: 4 });
  });

  it('lose no row of any text, and never throw', () => {
    const cell = fc.oneof(fc.constantFrom('key', 'Name', 'purity', 'N2 balance', '200 bar', 'gas', '1,5', '', '"', 'x'), text);
    const table = fc.tuple(fc.array(fc.array(cell, { maxLength: 6 }), { maxLength: 6 }), delimiter)
      .map(([rows, separator]) => rows.map((row) => row.join(separator)).join('\n'));
    fc.assert(fc.property(fc.oneof(table, fc.string()), (any) => {
      for (const { entries, unread } of readAs(any)) {
        expect(new Set(entries.map(({ key }) => key)).size).toBe(entries.length);
        // One of the separators sees as many rows with something in them, less the head.
        const counts = ([',', ';', '\t'] as const).map((separator) => readCells(any, separator).rows.filter((row) => row.some((one) => one !== '')).length);
        expect(counts.map((count) => Math.max(0, count - 1))).toContain(entries.length + unread.length);
      }
      readPurityPaste(any);
      readParentsPaste(any);
    }), { numRuns: 300, seed: 4 });
  });
});

describe('purity tables', () => {
  it('come back from one text as they were written', () => {
    fc.assert(fc.property(fc.array(line, { maxLength: 8 }), (lines) => {
      expect(readPurityText(purityText(lines))).toEqual({ lines, notUnderstood: [] });
    }), { numRuns: 300, seed: 4 });
  });

  it('keep every piece of any text', () => {
    fc.assert(fc.property(fc.string(), (any) => {
      const pieces = any.split(/[;\n\r]/).filter((piece) => piece.trim() !== '').length;
      expect(readPurityText(any).lines).toHaveLength(pieces);
    }), { numRuns: 300, seed: 4 });
  });
});

describe('stock files', () => {
  it('come back as they were written, whatever stands in them', () => {
    fc.assert(fc.property(listOf(parent), listOf(cylinder), (parents, cylinders) => {
      const stock = { ...demoStock, parents, cylinders };
      expect(decodeStock(encodeStock(stock, ''))).toMatchObject({ ok: true, value: { stock } });
    }), { numRuns: 100, seed: 4 });
  });
});
