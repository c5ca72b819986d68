import { fileProblemSentence } from '../blending/index.ts';
import type { ActionProblem, Notice, SaveProblem, SaveState } from './contract.ts';
import type { EntryProblem } from './persist/envelope.ts';

/** What the save indicator says. */
export function saveSentence(save: SaveState): string {
  switch (save.kind) {
    case 'saved': return 'Saved';
    case 'pending': return 'Saving…';
    case 'failed': return `Not saved: ${problemWords(save.problem)}`;
  }
}

/** Why an entry of the list cannot be opened. It has not been changed. */
export function savedEntrySentence(problem: EntryProblem): string {
  switch (problem.code) {
    case 'entry-empty': return 'The saved entry is empty.';
    case 'entry-not-json': return 'The saved entry is damaged: its first line cannot be read.';
    case 'entry-other-format': return 'The saved entry was not written by this program.';
    case 'entry-newer-version':
      return `The saved entry has version ${problem.version}; this program reads up to ${problem.newest}.`;
    case 'entry-checksum': return 'The saved entry was cut off or changed since it was written.';
    case 'entry-invalid': return `The saved entry is damaged: its field "${problem.field}" cannot be read.`;
    default: return fileProblemSentence(problem);
  }
}

/** Why an action was not carried out. */
export function actionSentence(problem: ActionProblem): string {
  switch (problem.code) {
    case 'storage-full':
    case 'storage-unavailable':
    case 'not-read-back':
    case 'deleted-elsewhere':
      return `Not saved: ${problemWords(problem)}`;
    case 'no-such-recipe': return 'That recipe is no longer in the list.';
    case 'would-lose-work':
      return `The open recipe is not saved and would be lost: ${problemWords(problem.problem)}`;
    default: return savedEntrySentence(problem);
  }
}

/** The notice as a sentence. */
export function noticeSentence(notice: Notice): string {
  switch (notice.kind) {
    case 'deleted': return `Deleted ${quoted(notice.name)}.`;
    case 'restored': return `Brought back ${quoted(notice.name)}.`;
    case 'imported': return `Imported ${quoted(notice.name)}.`;
    case 'import-failed': return `Nothing was imported. ${fileProblemSentence(notice.problem)}`;
    case 'edit-refused': return `The change was not taken. ${fileProblemSentence(notice.problem)}`;
    case 'save-failed': return `Not saved: ${problemWords(notice.problem)}`;
    case 'kept-as-copy':
      return `Another window changed this recipe. Its version is kept; yours goes on as ${quoted(notice.name)}.`;
    case 'changed-elsewhere':
      return `Another window changed ${quoted(notice.name)}; its version is shown. Undo brings yours back.`;
    case 'deleted-elsewhere':
      return `Another window deleted ${quoted(notice.name)}. It is saved again when you change it here.`;
    case 'unreadable': return `${savedEntrySentence(notice.problem)} It was left as it is and can be exported.`;
    case 'no-such-recipe': return actionSentence({ code: 'no-such-recipe', id: notice.id });
    case 'would-lose-work': return actionSentence({ code: 'would-lose-work', problem: notice.problem });
    case 'storage-failed': return `The browser's storage did not answer: ${problemWords(notice.problem)}`;
  }
}

function problemWords(problem: SaveProblem): string {
  switch (problem.code) {
    case 'storage-full': return 'the browser\'s storage is full. Export the recipe, or delete others.';
    case 'storage-unavailable':
      return `the browser gives this page no storage (${problem.detail}). Export the recipe to keep it.`;
    case 'not-read-back': return 'what was written could not be read back. Export the recipe to keep it.';
    case 'deleted-elsewhere': return 'another window deleted this recipe. It is saved again when you change it here.';
  }
}

function quoted(name: string): string {
  return name.trim() === '' ? 'a recipe without a name' : `“${name}”`;
}
