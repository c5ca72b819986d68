import { parseAmountFraction } from '../../../units/index.ts';
import { findGas } from '../../../thermo/index.ts';
import { isBalanceText } from '../../recipe/composition.ts';
import type { PurityBasis, PurityLine } from '../../recipe/document.ts';
import { readOrderText } from '../../recipe/order-text.ts';
import type { StockParent } from '../document.ts';
import { readCells } from './cells.ts';
import type { CellFault, TableProblem } from './problem.ts';
import { readPurityText } from './purity-text.ts';
import { readTable } from './table.ts';
import type { TableReading } from './table.ts';
import { parentTable } from './tables.ts';

/** A purity table as pasted; every row that has a text is a line, also one in which something is doubtful. */
export interface PastedPurity {
  readonly lines: readonly PurityLine[];
  readonly problems: readonly TableProblem[];
}

type Role = 'gas' | 'amount' | 'unit' | 'uncertainty' | 'basis';

const HEADS: readonly (readonly [Role, RegExp])[] = [
  ['uncertainty', /^(?:expanded\s+)?uncertainty|^u\b|^±|^\+\/-/i],
  ['gas', /^(?:gas|component|compound|impurity|substance|species|analyte|name)/i],
  ['unit', /^units?$/i],
  ['basis', /^(?:basis|kind|type|status)/i],
  ['amount', /^(?:amount|content|fraction|mole fraction|concentration|conc|value|result|purity|level|[nµmu]?mol|%)/i],
];

const BASIS: readonly (readonly [PurityBasis, RegExp])[] = [
  ['certified', /^(?:certified|measured|analysed|analyzed)$/i],
  ['typical', /^(?:typical|nominal|specification|spec\.?)$/i],
];

/**
 * Reads a purity table pasted from a spreadsheet: gas, amount, uncertainty and
 * basis in any order of columns, with heads or without, the unit in the cell, in
 * a column of its own or in the head (`content (µmol/mol)`). Without tabs each
 * line is read as `CO 0.5 % ±2 %`.
 */
export function readPurityPaste(text: string): PastedPurity {
  if (!text.includes('\t')) return readLines(text);
  const rows = readCells(text, '\t').rows.map((cells, index) => ({ cells, row: index + 1 })).filter(({ cells }) => cells.some((cell) => cell !== ''));
  const head = rows[0] !== undefined && isHead(rows[0].cells) ? rows[0].cells : null;
  const body = head === null ? rows : rows.slice(1);
  const roles = head === null ? rolesByCells(body.map(({ cells }) => cells)) : rolesByHeads(head);
  const problems: TableProblem[] = [];
  head?.forEach((header, index) => {
    if (header !== '' && roles[index] === null) {
      problems.push({ code: 'header-unknown', column: index + 1, header, known: ['gas', 'amount', 'unit', 'uncertainty', 'basis'] });
    }
  });
  const lines = body.map(({ cells, row }) => readRow(cells, row, roles, head ?? [], problems));
  return { lines, problems };
}

/**
 * Reads a list of parents pasted from a spreadsheet: with the heads of the
 * parents table, or without heads as name, purity table, pressure, water
 * capacity, lot, expiry, location. A parent without a purity table takes what
 * its name says (`CO 0.5 % in N₂`, `N₂ 5.0` as the gas alone), and that is said.
 */
export function readParentsPaste(text: string): TableReading<StockParent> {
  const heads = ['name', 'purity table', 'pressure', 'water capacity', 'lot', 'expiry', 'location'];
  return readTable(parentTable, text, heads, (entry, row, problems) => {
    const composition = entry.composition.length === 0 ? purityOfName(entry.name) : [];
    if (composition.length === 0) return entry;
    problems.push({ code: 'cell', row, column: 1, header: 'name', text: entry.name, fault: { code: 'purity-from-name' }, taken: true });
    return { ...entry, composition };
  });
}

function readLines(text: string): PastedPurity {
  const { lines, notUnderstood } = readPurityText(text);
  const problems = lines.flatMap((line, index): TableProblem[] => {
    const cell = { code: 'cell', row: index + 1, column: 1, header: '', text: line.gas, taken: true } as const;
    if (notUnderstood.includes(line.gas) && line.amount === '') {
      return [{ ...cell, fault: { code: 'purity-not-understood', pieces: [line.gas] } }];
    }
    return findGas(line.gas) === undefined ? [{ ...cell, fault: { code: 'gas-unknown' } }] : [];
  });
  return { lines, problems };
}

function isHead(cells: readonly string[]): boolean {
  const isData = cells.some((cell) => findGas(cell) !== undefined || (/\d/.test(cell) && parseAmountFraction(cell).ok));
  return !isData && cells.some((cell) => HEADS.some(([, words]) => words.test(cell)));
}

/** Each role once, the leftmost column that has it. */
function rolesByHeads(heads: readonly string[]): readonly (Role | null)[] {
  const used = new Set<Role>();
  return heads.map((head) => {
    const role = HEADS.find(([each, words]) => !used.has(each) && words.test(head))?.[0] ?? null;
    if (role !== null) used.add(role);
    return role;
  });
}

/** What a column holds, by what its cells look like: of two columns of amounts the second is the uncertainty. */
function rolesByCells(rows: readonly (readonly string[])[]): readonly (Role | null)[] {
  const width = Math.max(0, ...rows.map((cells) => cells.length));
  const used = new Set<Role>();
  return Array.from({ length: width }, (_, column) => {
    const cells = rows.map((row) => row[column] ?? '').filter((cell) => cell !== '');
    const most = (test: (cell: string) => boolean): boolean => cells.filter(test).length * 2 > cells.length;
    const role: Role | null = most((cell) => basisOf(cell) !== null) ? 'basis'
      : most(isUnit) ? 'unit'
      : most((cell) => /^(?:±|\+\/-|\+-)/.test(cell)) ? 'uncertainty'
      : most((cell) => /^[<≤]?=?\s*\d/.test(cell) || isBalanceText(cell)) ? (used.has('amount') ? 'uncertainty' : 'amount')
      : cells.length > 0 ? 'gas' : null;
    if (role === null || used.has(role)) return null;
    used.add(role);
    return role;
  });
}

function readRow(
  cells: readonly string[], row: number, roles: readonly (Role | null)[], heads: readonly string[], problems: TableProblem[],
): PurityLine {
  const columnOf = (role: Role): number => roles.indexOf(role);
  const cellOf = (role: Role): string => cells[columnOf(role)] ?? '';
  const unitOf = (role: Role): string => unitInHead(heads[columnOf(role)] ?? '');
  const note = (role: Role, fault: CellFault): void => {
    const column = columnOf(role);
    problems.push({ code: 'cell', row, column: column + 1, header: heads[column] ?? role, text: cellOf(role), fault, taken: true });
  };
  const gas = cellOf('gas');
  if (findGas(gas) === undefined) note('gas', gas === '' ? { code: 'needed' } : { code: 'gas-unknown' });
  const amount = isBalanceText(cellOf('amount')) ? 'balance' : withUnit(cellOf('amount'), cellOf('unit') || unitOf('amount'));
  const read = parseAmountFraction(amount);
  if (amount !== 'balance' && !read.ok) note('amount', { code: 'entry', problem: read.reason });
  const bare = cellOf('uncertainty').replace(/^(?:±|\+\/-|\+-)\s*/, '');
  const uncertainty = bare === '' || amount === 'balance' && !/\d/.test(bare) ? '' : withUnit(bare, unitOf('uncertainty') || cellOf('unit') || unitOf('amount'));
  const size = parseAmountFraction(uncertainty);
  if (uncertainty !== '' && !size.ok) note('uncertainty', { code: 'entry', problem: size.reason });
  const basis = basisOf(cellOf('basis'));
  if (cellOf('basis') !== '' && basis === null) note('basis', { code: 'not-an-option', options: ['certified', 'typical'] });
  return { gas, amount, uncertainty, basis: basis ?? 'certified' };
}

/** A number without a unit gets the one that its column states. */
function withUnit(text: string, unit: string): string {
  return unit !== '' && /^[<≤]?=?\s*[\d.,' ]+(?:e[-+]?\d+)?$/i.test(text) ? `${text} ${unit}` : text;
}

/** `content (µmol/mol)`, `amount [%]`, `x / %`, `µmol/mol`: the unit; empty when the head has none. */
function unitInHead(head: string): string {
  const inside = /[([]\s*([^)\]]+?)\s*[)\]]\s*$/.exec(head)?.[1] ?? /\s\/\s*(\S+)$/.exec(head)?.[1] ?? head;
  return isUnit(inside) ? inside : '';
}

function isUnit(text: string): boolean {
  return !/\d/.test(text) && parseAmountFraction(`1 ${text}`).ok && text !== '';
}

function basisOf(text: string): PurityBasis | null {
  return BASIS.find(([, words]) => words.test(text))?.[0] ?? null;
}

/** What the name of a parent says of its composition; empty when it says nothing for certain. */
function purityOfName(name: string): readonly PurityLine[] {
  const line = (gas: string, amount: string): PurityLine => ({ gas, amount, uncertainty: '', basis: 'certified' });
  const alone = name.replace(/\s+\d\.\d$/, '');
  if (findGas(alone) !== undefined) return [line(alone, '100 %')];
  const { components, notUnderstood } = readOrderText(name);
  const isWhole = components.length > 1 && notUnderstood.length === 0 && components.every(({ gas }) => findGas(gas) !== undefined);
  return isWhole ? components.map(({ gas, amount }) => line(gas, amount)) : [];
}
