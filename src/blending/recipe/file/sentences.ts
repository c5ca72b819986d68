import type { FileProblem } from './problem.ts';

/** Why a text is not taken as a recipe file, as a sentence. */
export function fileProblemSentence(problem: FileProblem): string {
  switch (problem.code) {
    case 'too-large':
      return `The file is too large for a recipe: ${problem.characters} characters, at most ${problem.limit}.`;
    case 'not-json': return `The file is not JSON: ${problem.detail}.`;
    case 'not-a-recipe-file': return 'The file is not a recipe of this program: its "format" is not "fillwright-recipe".';
    case 'newer-version':
      return `The recipe was written by a newer program (version ${problem.version}); this one reads up to ${problem.newest}.`;
    case 'no-migration': return `This program no longer reads version ${problem.version} of the recipe file.`;
    case 'field-invalid': return fieldSentence(problem);
  }
}

function fieldSentence({ path, fault, expected, received }: Extract<FileProblem, { code: 'field-invalid' }>): string {
  const field = path === '' ? 'The file' : `The field "${path}"`;
  switch (fault) {
    case 'missing': return `${field} is missing.`;
    case 'unknown': return `${field} is not known.`;
    case 'wrong-type': return `${field} should be ${expected}, not ${received}.`;
    case 'not-an-option': return `${field} should be ${expected.replaceAll('|', 'or')}, not ${received}.`;
    case 'too-long': return `${field} is too long: ${received} characters, at most ${expected.replace('<=', '')}.`;
    case 'too-many': return `${field} has too many lines: ${received}, at most ${expected.replace('<=', '')}.`;
  }
}
