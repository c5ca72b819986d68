import { forbiddenWords, impureNames, keptApart, layers, longestFile, mayUse, packageHomes, pureLayers } from './layers.ts';
import type { Layer } from './layers.ts';
import type { Source } from './sources.ts';
import { parse } from './syntax.ts';
import type { Reference, Syntax } from './syntax.ts';

export type ViolationKind =
  | 'no layer' | 'upward' | 'past the door' | 'kept apart' | 'outside src' | 'package away from home' | 'unreadable import'
  | 'impure' | 'folder cycle' | 'too long' | 'forbidden words';

export interface Violation {
  readonly kind: ViolationKind;
  readonly path: string;
  readonly detail: string;
}

const root = 'src/main.tsx';

function layerOf(path: string): Layer | undefined {
  const folder = path.split('/')[1];
  return layers.find((layer) => layer === folder && path.startsWith(`src/${layer}/`));
}

function checkReference(path: string, { specifier, target }: Reference): Violation[] {
  if (target === null) return checkPackage(path, specifier);
  if (!target.startsWith('src/')) return [{ kind: 'outside src', path, detail: specifier }];
  const from = layerOf(path);
  const to = layerOf(target);
  if (to === undefined) return [{ kind: 'upward', path, detail: `${specifier} belongs to no layer` }];
  const found: Violation[] = [];
  if (from !== to) {
    if (path !== root && !(from !== undefined && mayUse[from].includes(to))) {
      found.push({ kind: 'upward', path, detail: `${from ?? 'no layer'} may not use ${to}` });
    }
    if (target !== `src/${to}/index.ts`) found.push({ kind: 'past the door', path, detail: `${specifier} is not ${to}/index.ts` });
  }
  if (keptApart.some((pair) => pair.from.test(path) && pair.to.test(target))) found.push({ kind: 'kept apart', path, detail: specifier });
  return found;
}

function checkPackage(path: string, specifier: string): Violation[] {
  const [first = '', second = ''] = specifier.split('/');
  const name = specifier.startsWith('node:') ? 'node' : specifier.startsWith('@') ? `${first}/${second}` : first;
  const home = packageHomes[name];
  return home?.test(path) === true ? [] : [{ kind: 'package away from home', path, detail: specifier }];
}

function checkFile({ source: { path, text }, references, unreadable, freeNames, texts }: Syntax): Violation[] {
  const found = references.flatMap((reference) => checkReference(path, reference));
  const layer = layerOf(path);
  if (layer === undefined && path !== root) found.push({ kind: 'no layer', path, detail: 'only main.tsx stands outside the layers' });
  for (const line of unreadable) found.push({ kind: 'unreadable import', path, detail: `line ${line}` });
  if (layer !== undefined && pureLayers.includes(layer)) {
    for (const { name, line } of freeNames) if (impureNames.has(name)) found.push({ kind: 'impure', path, detail: `${name}, line ${line}` });
  }
  const length = text.trimEnd().split('\n').length;
  if (length > longestFile && !path.includes('/data/')) found.push({ kind: 'too long', path, detail: `${length} lines` });
  const banned = forbiddenWords.filter(({ where }) => where.test(path));
  for (const { text: piece, line } of texts) {
    if (banned.some(({ words, unless }) => words.test(piece) && unless?.test(piece) !== true)) {
      found.push({ kind: 'forbidden words', path, detail: `"${piece.trim()}", line ${line}` });
    }
  }
  return found;
}

/** The folder directly under a layer; null for a file of the layer itself, such as its door. */
function folderOf(path: string): string | null {
  const parts = path.split('/');
  return parts.length > 3 ? parts.slice(0, 3).join('/') : null;
}

/** Folders of one layer that need each other when the program runs. Types may refer to each other: they are erased. */
function folderCycles(files: readonly Syntax[]): Violation[] {
  const needs = new Map<string, Set<string>>();
  for (const { source, references } of files) {
    const from = folderOf(source.path);
    for (const { runtime, target } of references) {
      const to = target === null ? null : folderOf(target);
      if (!runtime || from === null || to === null || from === to || layerOf(from + '/') !== layerOf(to + '/')) continue;
      needs.set(from, (needs.get(from) ?? new Set()).add(to));
    }
  }
  const reaches = (from: string, goal: string, seen = new Set<string>()): boolean => [...(needs.get(from) ?? [])].some((next) => {
    if (next === goal) return true;
    if (seen.has(next)) return false;
    return reaches(next, goal, seen.add(next));
  });
  return [...needs.keys()].filter((folder) => reaches(folder, folder))
    .map((folder) => ({ kind: 'folder cycle', path: folder, detail: `needs ${[...(needs.get(folder) ?? [])].join(', ')}` }));
}

/** Everything in these files that breaks a rule of the layout. */
export function violations(sources: readonly Source[]): Violation[] {
  const files = sources.map(parse);
  return [...files.flatMap(checkFile), ...folderCycles(files)];
}
