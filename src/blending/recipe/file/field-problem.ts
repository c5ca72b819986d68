import type * as v from 'valibot';
import type { FieldFault, FileProblem } from './problem.ts';

/** Whether a value can be the version of a file: a whole number from 1 on. */
export function isVersion(version: unknown): version is number {
  return typeof version === 'number' && Number.isSafeInteger(version) && version >= 1;
}

/** The first fault that a schema found, with the place of its field. */
export function fieldProblem(issue: v.BaseIssue<unknown>): Extract<FileProblem, { readonly code: 'field-invalid' }> {
  return {
    code: 'field-invalid',
    path: (issue.path ?? []).reduce((path, { key }) => path + pathPart(key, path === ''), ''),
    fault: fieldFault(issue),
    expected: issue.expected ?? '',
    received: issue.received.slice(0, 80),
  };
}

function pathPart(key: unknown, first: boolean): string {
  if (typeof key === 'number') return `[${key}]`;
  // A hostile file may have a field name of any length.
  const name = String(key).slice(0, 80);
  return first ? name : `.${name}`;
}

function fieldFault(issue: v.BaseIssue<unknown>): FieldFault {
  const last = issue.path?.at(-1);
  if (last !== undefined && 'origin' in last && last.origin === 'key') {
    return issue.expected === 'never' ? 'unknown' : 'missing';
  }
  if (issue.type === 'max_length') return typeof issue.input === 'string' ? 'too-long' : 'too-many';
  if (issue.type === 'picklist' || issue.type === 'literal') return 'not-an-option';
  return 'wrong-type';
}
