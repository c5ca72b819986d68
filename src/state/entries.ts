import { decodeRecipeFile, encodeRecipeFile, recipeFault, type Recipe } from '../blending/index.ts';
import { fail, ok, type Outcome } from '../units/index.ts';
import type { ActionProblem, ExportedFile, LeaveOptions, Notice } from './contract.ts';
import { decodeEntry, type Entry } from './persist/envelope.ts';
import { recipeKey } from './persist/storage.ts';
import { flush, nameWith } from './saving.ts';
import { showRecipe, storeEntry, tell, unusedId, type Session } from './session.ts';

/** Opens an entry; see `WorkspaceActions.open`. */
export function openEntry<Answer>(session: Session<Answer>, id: string, options: LeaveOptions): Outcome<string, ActionProblem> {
  if (id === session.store.getState().openId) return ok(id);
  const read = readEntry(session, id);
  if (!read.ok) return refuse(session, id, read.reason);
  const left = leave(session, options);
  if (!left.ok) return left;
  showRecipe(session, { id, entry: read.value.entry, base: read.value.text, problem: null });
  return ok(id);
}

/** Saves a recipe under a new id and opens it; when saving fails it is on the screen and says so. */
export function createEntry<Answer>(session: Session<Answer>, recipe: Recipe, options: LeaveOptions): Outcome<string, ActionProblem> {
  const fault = recipeFault(recipe);
  if (fault !== null) {
    tell(session, { kind: 'edit-refused', problem: fault });
    return fail(fault);
  }
  const left = leave(session, options);
  if (!left.ok) return left;
  return ok(openNew(session, recipe));
}

/** As `createEntry`, for a recipe known to be within bounds and nothing to leave. */
export function openNew<Answer>(session: Session<Answer>, recipe: Recipe): string {
  const id = unusedId(session);
  const entry: Entry = { recipe, savedAt: session.deps.clock(), issued: null };
  const stored = storeEntry(session, id, entry);
  const problem = stored.ok ? null : stored.reason;
  showRecipe(session, { id, entry, base: stored.ok ? stored.value : null, problem });
  if (problem !== null) tell(session, { kind: 'save-failed', problem });
  return id;
}

/** Copies an entry and opens the copy. */
export function duplicateEntry<Answer>(session: Session<Answer>, id: string, options: LeaveOptions): Outcome<string, ActionProblem> {
  const recipe = currentRecipe(session, id);
  if (!recipe.ok) return refuse(session, id, recipe.reason);
  return createEntry(session, { ...recipe.value, name: nameWith(recipe.value.name, ' copy') }, options);
}

/** Renames an entry that is not open. */
export function renameClosed<Answer>(session: Session<Answer>, id: string, name: string): Outcome<string, ActionProblem> {
  const read = readEntry(session, id);
  if (!read.ok) return refuse(session, id, read.reason);
  const recipe = { ...read.value.entry.recipe, name };
  const fault = recipeFault(recipe);
  if (fault !== null) {
    tell(session, { kind: 'edit-refused', problem: fault });
    return fail(fault);
  }
  const stored = storeEntry(session, id, { ...read.value.entry, recipe, savedAt: session.deps.clock() });
  if (stored.ok) return ok(id);
  tell(session, { kind: 'save-failed', problem: stored.reason });
  return stored;
}

/** Reads an exported file into a new entry and opens it. */
export function importFile<Answer>(session: Session<Answer>, text: string, options: LeaveOptions): Outcome<string, ActionProblem> {
  const file = decodeRecipeFile(text);
  if (!file.ok) {
    tell(session, { kind: 'import-failed', problem: file.reason });
    return file;
  }
  const created = createEntry(session, file.value.recipe, options);
  const { save } = session.store.getState();
  if (created.ok && save.kind === 'saved') {
    tell(session, { kind: 'imported', id: created.value, name: file.value.recipe.name });
  }
  return created;
}

/** The file of a recipe, or the raw text of an entry that cannot be read. */
export function exportFile<Answer>(session: Session<Answer>, id: string): Outcome<ExportedFile, ActionProblem> {
  const recipe = currentRecipe(session, id);
  if (recipe.ok) {
    return ok({ fileName: fileName(recipe.value.name), text: encodeRecipeFile(recipe.value, session.deps.program) });
  }
  const raw = session.deps.storage.read(recipeKey(id));
  if (raw.ok && raw.value !== null) return ok({ fileName: `${id}.unreadable.txt`, text: raw.value });
  return refuse(session, id, recipe.reason);
}

/** Saves the open recipe before another takes its place; refuses when its edits would be lost. */
export function leave<Answer>(session: Session<Answer>, { discardUnsaved = false }: LeaveOptions): Outcome<null, ActionProblem> {
  if (flush(session) || discardUnsaved) return ok(null);
  const { save } = session.store.getState();
  if (save.kind !== 'failed') return ok(null);
  tell(session, { kind: 'would-lose-work', problem: save.problem });
  return fail({ code: 'would-lose-work', problem: save.problem });
}

/** Reads and checks one stored entry. */
export function readEntry<Answer>(
  session: Session<Answer>,
  id: string,
): Outcome<{ readonly text: string; readonly entry: Entry }, ActionProblem> {
  const text = session.deps.storage.read(recipeKey(id));
  if (!text.ok) return text;
  if (text.value === null) return fail({ code: 'no-such-recipe', id });
  const entry = decodeEntry(text.value);
  return entry.ok ? ok({ text: text.value, entry: entry.value }) : entry;
}

/** The recipe of an entry as it is on the screen, or else as stored. */
function currentRecipe<Answer>(session: Session<Answer>, id: string): Outcome<Recipe, ActionProblem> {
  const { openId, recipe } = session.store.getState();
  if (id === openId) return ok(recipe);
  const read = readEntry(session, id);
  return read.ok ? ok(read.value.entry.recipe) : read;
}

/** Tells why an action on an entry was not carried out. */
export function refuse<Answer>(session: Session<Answer>, id: string, problem: ActionProblem): Outcome<never, ActionProblem> {
  tell(session, refusal(id, problem));
  return fail(problem);
}

function refusal(id: string, problem: ActionProblem): Notice {
  switch (problem.code) {
    case 'storage-full':
    case 'storage-unavailable':
      return { kind: 'storage-failed', problem };
    case 'would-lose-work':
      return { kind: 'would-lose-work', problem: problem.problem };
    case 'not-read-back':
    case 'deleted-elsewhere':
      return { kind: 'save-failed', problem };
    case 'no-such-recipe':
      return { kind: 'no-such-recipe', id };
    default:
      return { kind: 'unreadable', id, problem };
  }
}

/** A file name of plain letters that any system takes. */
function fileName(name: string): string {
  const plain = name.normalize('NFKD').replace(/\p{Mark}/gu, '').replace(/[^A-Za-z0-9]+/g, '-').replace(/^-+|-+$/g, '').slice(0, 60);
  return `${plain === '' ? 'recipe' : plain.toLowerCase()}.fillwright.json`;
}
