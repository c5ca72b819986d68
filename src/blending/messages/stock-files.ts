import { fileProblemSentence } from '../recipe/file/sentences.ts';
import type { CellFault, TableProblem } from '../stock/csv/problem.ts';
import type { StockFileProblem } from '../stock/file/problem.ts';
import { entrySentence } from './entry.ts';

/** Why a text is not taken as a stock file. */
export function stockFileSentence(problem: StockFileProblem): string {
  switch (problem.code) {
    case 'too-large':
      return `The file is too large for a stock: ${String(problem.characters)} characters, at most ${String(problem.limit)}.`;
    case 'not-a-stock-file': return 'The file is not a stock of this program: its "format" is not "fillwright-stock".';
    case 'newer-version':
      return `The stock was written by a newer program (version ${String(problem.version)}); this one reads up to ${String(problem.newest)}.`;
    case 'no-migration': return `This program no longer reads version ${String(problem.version)} of the stock file.`;
    case 'key-repeated': return `The key “${problem.key}” is used twice: at "${problem.path}" once more.`;
    case 'not-json':
    case 'field-invalid':
      return fileProblemSentence(problem);
  }
}

/** What is the matter with a table that was imported or pasted, with its place. */
export function tableSentence(problem: TableProblem): string {
  switch (problem.code) {
    case 'table-too-large':
      return `The table is too large: ${String(problem.characters)} characters, at most ${String(problem.limit)}.`;
    case 'table-empty': return 'The table is empty.';
    case 'quotes-open': return `Row ${String(problem.row)}: a quotation mark is not closed; the row was not taken.`;
    case 'header-unknown':
      return `Column ${String(problem.column)}: the head “${problem.header}” is not known; the column was not read. Known heads: ${problem.known.join(', ')}.`;
    case 'header-repeated': return `Column ${String(problem.column)}: the head “${problem.header}” stands twice; the first one was read.`;
    case 'header-missing': return `The table has no column “${problem.header}”.`;
    case 'cells-too-many':
      return `Row ${String(problem.row)}: ${String(problem.cells)} cells under ${String(problem.columns)} heads; the row was not taken. A comma inside a cell needs quotation marks around the cell.`;
    case 'rows-too-many': return `Row ${String(problem.row)}: only ${String(problem.limit)} rows are taken.`;
    case 'key-repeated-in-table': return `Row ${String(problem.row)}: the key “${problem.key}” stands in a row before; the row was not taken.`;
    case 'cell': {
      const head = problem.header === '' ? '' : `, ${problem.header}`;
      const taken = problem.taken ? '' : ' The row was not taken.';
      return `Row ${String(problem.row)}${head}: ${cellFaultSentence(problem.fault, problem.text)}${taken}`;
    }
  }
}

/** What is the matter with one cell. */
export function cellFaultSentence(fault: CellFault, text: string): string {
  switch (fault.code) {
    case 'needed': return 'this is needed and was left empty.';
    case 'not-an-option': return `“${text}” is none of ${fault.options.join(', ')}.`;
    case 'too-long': return `longer than ${String(fault.limit)} characters.`;
    case 'too-many-lines': return `more than ${String(fault.limit)} lines.`;
    case 'not-a-date': return `“${text}” is not a day written as 2027-03-31.`;
    case 'entry': return entrySentence(fault.problem);
    case 'gas-unknown': return `“${text}” is not one of the gases that this program can compute.`;
    case 'gases-unknown': return `${fault.gases.map((gas) => `“${gas}”`).join(', ')} cannot be computed by this program.`;
    case 'purity-not-understood': return `no gas with an amount in ${fault.pieces.map((piece) => `“${piece}”`).join(', ')}.`;
    case 'purity-from-name': return `no purity table was given; “${text}” was taken at its word.`;
  }
}
