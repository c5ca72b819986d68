/** What the stock screens compute with, fetched together when somebody first needs them. */
export * from './file/file.ts';
export { demoStock } from './demo.ts';
export { balanceWords, cylinderFromStock, gaugeFromStock, parentFromStock, refreshedCylinder, shareText, thermometerWords } from './copy.ts';
export type { Delimiter } from './csv/cells.ts';
export { readParentsPaste, readPurityPaste } from './csv/paste.ts';
export type { CellFault, TableProblem } from './csv/problem.ts';
export { purityText, readPurityText } from './csv/purity-text.ts';
export { freeKey, largestTable, readTable, writeTable } from './csv/table.ts';
export type { Table, TableReading } from './csv/table.ts';
export { balanceTable, cylinderTable, gaugeTable, parentTable, thermometerTable } from './csv/tables.ts';
export { objectives } from './choose/costs.ts';
export type { Objective } from './choose/costs.ts';
export type { Impossible, Shortage } from './choose/impossible.ts';
export type { Proposal, SetAside } from './choose/proposal.ts';
export { proposeFromStock } from './choose/propose.ts';
export type { Proposals } from './choose/propose.ts';
export * from '../messages/stock.ts';
