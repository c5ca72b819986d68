/**
 * Door of the state layer (level 3): may use `units` and `blending`. No React:
 * views bind to `Workspace.store` and change things through `Workspace.actions`.
 */
export { createWorkspace } from './workspace.ts';
export type {
  ActionProblem, ExportedFile, LeaveOptions, LibraryEntry, Notice, SaveProblem, SaveState, Workspace,
  WorkspaceActions, WorkspaceDependencies, WorkspaceState, WorkspaceStore,
} from './contract.ts';
export type { Command } from './command.ts';
export * from './commands/index.ts';
export { sheetIdentity, sheetRevision } from './revision.ts';
export { actionSentence, savedEntrySentence, noticeSentence, saveSentence } from './messages.ts';
export type { EntryProblem, Issued } from './persist/envelope.ts';
export type {
  StockActions, StockCommand, StockNotice, Stockroom, StockroomDependencies, StockState,
} from './stock/contract.ts';
export type { StockItem, StockList } from './stock/commands.ts';
export { loadStockroom } from './stock/load.ts';
export type { StockroomTools } from './stock/load.ts';
export { localRecipeStorage } from './persist/local.ts';
export type { StorageArea, StorageEvents } from './persist/local.ts';
export { memoryRecipeStorage } from './persist/memory.ts';
export type { RecipeStorage, StorageProblem } from './persist/storage.ts';
