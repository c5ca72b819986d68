import { describe, expect, it } from 'vitest';
import { demoStock } from '../../../src/blending/stock/tools.ts';
import {
  benchSentence, cellFaultSentence, impossibleSentences, lastingSentence, leftOutSentence, setAsideSentence, shortageSentence, stockFileSentence,
  supplyGapSentence, tableSentence, traceSentence, undecidedSentence, unorderedSentence,
} from '../../../src/blending/messages/stock.ts';
import type { BenchProblem, LeftOutReason } from '../../../src/blending/stock/choose/bench.ts';
import type { Shortage } from '../../../src/blending/stock/choose/impossible.ts';
import type { CellFault, StockFileProblem, StoreGap, TableProblem } from '../../../src/blending/index.ts';
import { mole, pascal } from '../../../src/units/index.ts';
import { expectSentence } from './sentences.ts';

/** One example of every code; a new code without an example does not compile. */
type Each<Union extends { readonly code: string }> = { readonly [Code in Union['code']]: Extract<Union, { readonly code: Code }> };

const fileProblems: Each<StockFileProblem> = {
  'too-large': { code: 'too-large', characters: 9, limit: 8 },
  'not-json': { code: 'not-json', detail: 'Unexpected end' },
  'not-a-stock-file': { code: 'not-a-stock-file' },
  'newer-version': { code: 'newer-version', version: 2, newest: 1 },
  'no-migration': { code: 'no-migration', version: 0 },
  'key-repeated': { code: 'key-repeated', path: 'stock.gauges[1]', key: 'g1' },
  'field-invalid': { code: 'field-invalid', path: 'stock.parents[0].key', fault: 'missing', expected: '', received: '' },
};

const faults: Each<CellFault> = {
  'needed': { code: 'needed' },
  'not-an-option': { code: 'not-an-option', options: ['gas', 'liquefied'] },
  'too-long': { code: 'too-long', limit: 200 },
  'too-many-lines': { code: 'too-many-lines', limit: 40 },
  'not-a-date': { code: 'not-a-date' },
  'entry': { code: 'entry', problem: { code: 'not-a-number', text: 'much' } },
  'gas-unknown': { code: 'gas-unknown' },
  'gases-unknown': { code: 'gases-unknown', gases: ['Xenonite'] },
  'purity-not-understood': { code: 'purity-not-understood', pieces: ['moisture free'] },
  'purity-from-name': { code: 'purity-from-name' },
};

const tableProblems: Each<TableProblem> = {
  'table-too-large': { code: 'table-too-large', characters: 9, limit: 8 },
  'table-empty': { code: 'table-empty' },
  'quotes-open': { code: 'quotes-open', row: 3 },
  'header-unknown': { code: 'header-unknown', column: 2, header: 'colour', known: ['key', 'name'] },
  'header-repeated': { code: 'header-repeated', column: 2, header: 'name' },
  'header-missing': { code: 'header-missing', header: 'material' },
  'cells-too-many': { code: 'cells-too-many', row: 4, cells: 7, columns: 5 },
  'rows-too-many': { code: 'rows-too-many', row: 501, limit: 500 },
  'key-repeated-in-table': { code: 'key-repeated-in-table', row: 4, key: 'n2' },
  'cell': { code: 'cell', row: 3, column: 2, header: 'material', text: 'wood', fault: faults['not-an-option'], taken: false },
};

const leftOut: Each<LeftOutReason> = {
  'expired': { code: 'expired', expiry: '2026-11-30' },
  'expiry-unreadable': { code: 'expiry-unreadable', expiry: 'spring' },
  'unreadable': { code: 'unreadable', problems: [{ code: 'gas-unknown', field: 'parents.a.composition.0.gas', text: 'phlogiston' }] },
};

const benchProblems: Each<BenchProblem> = {
  'recipe-problems': { code: 'recipe-problems', problems: [{ code: 'no-components', field: 'order.components' }] },
  'nothing-to-choose-from': { code: 'nothing-to-choose-from', leftOut: [{ parent: 'a', name: 'Argon', reason: leftOut.expired }] },
};

const barometer = pascal(101_325);
const shortages: Each<Shortage> = {
  'component-missing': { code: 'component-missing', gases: ['carbon monoxide'] },
  'not-enough-gas': { code: 'not-enough-gas', parents: ['n2'] },
  'proportions': { code: 'proportions' },
  'residual-in-the-way': { code: 'residual-in-the-way', mayStay: 0.5, ventTo: pascal(10e5), barometer },
};

const gaps: Each<StoreGap> = {
  'water-capacity-not-stated': { code: 'water-capacity-not-stated' },
  'pressure-not-stated': { code: 'pressure-not-stated' },
  'content-not-stated': { code: 'content-not-stated' },
  'liquid-without-vapour-pressure': { code: 'liquid-without-vapour-pressure' },
  'state': { code: 'state', reason: { code: 'no-gas-root', temperature: 293.15, pressure: 60e5 } },
};

const nameOf = (key: string): string => demoStock.parents.find((each) => each.key === key)?.name ?? key;
const nearest = { components: [{ gas: 'nitrogen', nominal: 0.9, fraction: 0.95 }, { gas: 'oxygen', nominal: 0.1, fraction: 0.05 }] } as const;

describe('sentences about the stock', () => {
  it('are sentences, for every reason there is', () => {
    Object.values(fileProblems).map(stockFileSentence).forEach(expectSentence);
    Object.values(tableProblems).map(tableSentence).forEach(expectSentence);
    Object.values(faults).map((fault) => cellFaultSentence(fault, 'wood')).forEach(expectSentence);
    Object.values(leftOut).map((reason) => leftOutSentence({ parent: 'a', name: 'Argon', reason })).forEach(expectSentence);
    Object.values(benchProblems).map(benchSentence).forEach(expectSentence);
    expectSentence(undecidedSentence);
    expectSentence(benchSentence({ code: 'nothing-to-choose-from', leftOut: [] }));
    Object.values(shortages).map((shortage) => shortageSentence(shortage, nameOf)).forEach(expectSentence);
    Object.values(gaps).map((gap) => supplyGapSentence(gap, 'Argon')).forEach(expectSentence);
  });

  it('say in one go what is missing, what comes nearest and what would help', () => {
    const impossible = { code: 'impossible', nearest, setAside: [], considered: [], total: mole(60), barometer } as const;
    const pure = impossibleSentences({ ...impossible, shortage: shortages['component-missing'], remedies: [{ gas: 'carbon monoxide', vapourPressure: null }] }, nameOf);
    expect(pure).toEqual([
      'No parent of the stock holds CO.', 'The nearest that can be made is 95.0 % N₂, 5.00 % O₂.', 'One more parent of pure CO would make it possible.',
    ]);
    const premix = impossibleSentences({ ...impossible, shortage: shortages.proportions, remedies: [{ gas: 'sulfur dioxide', vapourPressure: pascal(3.3e5) }] }, nameOf);
    expect(premix[2]).toContain('as a premix');
    expect(impossibleSentences({ ...impossible, shortage: shortages.proportions, remedies: [] }, nameOf)[2]).toContain('No single pure gas');
    expect(impossibleSentences({ ...impossible, shortage: shortages['not-enough-gas'], remedies: [] }, nameOf)[0]).toContain('N₂ 5.0');
    expect(impossibleSentences({ ...impossible, shortage: shortages['residual-in-the-way'], remedies: [] }, nameOf)).toHaveLength(1);
    [...pure, ...premix].forEach(expectSentence);
  });

  it('say to which pressure to vent, rounded down, or to evacuate', () => {
    const vent = (ventTo: number | null): string =>
      shortageSentence({ ...shortages['residual-in-the-way'], ventTo: ventTo === null ? null : pascal(ventTo) }, nameOf);
    expect(vent(10.009e5)).toContain('Vent the cylinder to 8.99 bar gauge or less');
    expect(vent(0.50049e5)).toContain('Evacuate the cylinder to 0.500 bar absolute or less');
    expect(vent(null)).toContain('Evacuate the cylinder, or purge it');
    [vent(10.009e5), vent(0.50049e5), vent(null)].forEach(expectSentence);
  });

  it('say what was set aside, what comes as a trace, and how long a parent lasts', () => {
    const set = { parent: 'n2', name: 'N₂ 5.0', step: 2, pressure: pascal(140e5), stop: pascal(150e5), amount: mole(50) } as const;
    const known = {
      held: mole(400), pressure: pascal(200e5), afterOne: null, afterBatch: null, cylinders: 1, cylindersBoosted: null, runsOutAt: 2, step: 3, stop: pascal(150e5),
    };
    const sentences = [
      setAsideSentence({ ...set, code: 'pressure' }, barometer), setAsideSentence({ ...set, code: 'runs-out' }, barometer),
      setAsideSentence({ ...set, code: 'pressure', pressure: null }, barometer),
      traceSentence({ gas: 'oxygen', parent: 'n2', name: 'N₂ 5.0', share: 0.015, isLimit: true }), traceSentence({ gas: 'oxygen', parent: 'n2', name: 'N₂ 5.0', share: 0.015, isLimit: false }),
      unorderedSentence({ gas: 'water', fraction: 1.5e-6, amount: mole(1e-4) }),
      lastingSentence('N₂ 5.0', known, barometer), lastingSentence('N₂ 5.0', { ...known, runsOutAt: null, cylinders: 8, cylindersBoosted: 12 }, barometer),
      lastingSentence('N₂ 5.0', { ...known, step: 0, cylindersBoosted: 6 }, barometer),
    ];
    sentences.forEach(expectSentence);
    expect(sentences[0]).toBe('N₂ 5.0 was set aside: it stands at 138.99 bar gauge, the stop of step 2 is 148.99 bar gauge.');
    expect(sentences[6]).toContain('runs out at cylinder 2');
    expect(sentences[7]).toBe('N₂ 5.0 lasts for 8 cylinders. With the booster it lasts for 12.');
    expect(sentences[8]).toContain('With the booster it lasts for 6.');
  });
});
