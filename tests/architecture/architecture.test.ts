import { describe, expect, it } from 'vitest';
import { violations } from './rules.ts';
import type { ViolationKind } from './rules.ts';
import { readSources } from './sources.ts';

const sources = readSources();

describe('the program', () => {
  it('was read', () => {
    expect(sources.map(({ path }) => path)).toContain('src/units/index.ts');
    expect(sources.map(({ path }) => path)).toContain('src/thermo/index.ts');
  });

  it('breaks no rule of the layout', { timeout: 30_000 }, () => {
    expect(violations(sources)).toEqual([]);
  });
});

// A checker that finds nothing proves nothing, so each kind of violation is planted and must be found.
const planted: readonly [kind: ViolationKind, path: string, text: string][] = [
  ['upward', 'src/units/a.ts', "import { x } from '../thermo/index.ts';"],
  ['upward', 'src/thermo/a.ts', "import type { X } from '../blending/index.ts';"],
  ['upward', 'src/thermo/a.ts', "import { type X } from '../blending/index.ts';"],
  ['upward', 'src/thermo/deep/a.ts', "let x: import('../../state/index.ts').X;"],
  ['upward', 'src/blending/a.ts', "export * from '../state/index.ts';"],
  ['upward', 'src/blending/a.ts', "export type { X } from '../state/index.ts';"],
  ['upward', 'src/state/a.ts', "import '../thermo/index.ts';"],
  ['upward', 'src/state/a.ts', "const later = () => import('../ui/index.ts');"],
  ['upward', 'src/ui/parts/a.tsx', "import { x } from '../../thermo/index.ts';"],
  ['upward', 'src/ui/a.ts', "import { x } from '../headless/index.ts';"],
  ['upward', 'src/ui/a.ts', "import { x } from '../worker/index.ts';"],
  ['upward', 'src/ui/a.ts', "import { x } from '../main.tsx';"],
  ['upward', 'src/ui/a.ts', "const worker = new Worker(new URL('../worker/index.ts', import.meta.url));"],
  ['upward', 'src/headless/main.ts', "import { x } from '../state/index.ts';"],
  ['past the door', 'src/thermo/a.ts', "import { x } from '../units/outcome.ts';"],
  ['past the door', 'src/ui/a.ts', "const later = () => import('../blending/plan/plan.ts');"],
  ['past the door', 'src/main.tsx', "import { x } from './thermo/model/compile.ts';"],
  ['kept apart', 'src/thermo/terms/a.ts', "import { x } from '../data/x.ts';"],
  ['kept apart', 'src/thermo/solve/a.ts', "import type { X } from '../data/x.ts';"],
  ['kept apart', 'src/thermo/mixture/deep/a.ts', "import { x } from '../../data/x.ts';"],
  ['outside src', 'src/units/a.ts', "import { x } from '../../tests/x.ts';"],
  ['package away from home', 'src/ui/tasks/a.tsx', "import { Bar } from 'recharts';"],
  ['package away from home', 'src/thermo/a.ts', "import { unit } from 'mathjs';"],
  ['package away from home', 'src/state/a.ts', "import { useState } from 'react';"],
  ['package away from home', 'src/state/a.ts', "import { createRoot } from 'react-dom/client';"],
  ['package away from home', 'src/ui/tasks/a.tsx', "import { useStore } from 'zustand';"],
  ['package away from home', 'src/thermo/a.ts', "import { readFileSync } from 'node:fs';"],
  ['package away from home', 'src/ui/a.ts', "import { x } from '/src/thermo/index.ts';"],
  ['package away from home', 'src/ui/a.ts', "import { x } from '@/thermo/index.ts';"],
  ['unreadable import', 'src/ui/a.ts', 'const later = (name: string) => import(name);'],
  ['unreadable import', 'src/ui/a.ts', 'const later = (name: string) => import(`../${name}/index.ts`);'],
  ['no layer', 'src/helpers.ts', 'export const x = 1;'],
  ['no layer', 'src/helpers/x.ts', 'export const x = 1;'],
  ['impure', 'src/thermo/a.ts', 'export const now = () => Date.now();'],
  ['impure', 'src/thermo/a.ts', 'export const now = () => new Date();'],
  ['impure', 'src/blending/a.ts', 'export const x = () => Math.random();'],
  ['impure', 'src/blending/a.ts', "export const x = () => Math['random']();"],
  ['impure', 'src/blending/a.ts', 'export const { random } = Math;'],
  ['impure', 'src/units/a.ts', 'export const x = () => globalThis.performance.now();'],
  ['impure', 'src/units/a.ts', 'export const x = () => performance.now();'],
  ['impure', 'src/units/a.ts', "export const x = { log: console.log };"],
  ['impure', 'src/blending/a.ts', 'export const x = { crypto };'],
  ['impure', 'src/blending/a.ts', 'export const x = () => setTimeout(f, 1);'],
  ['impure', 'src/blending/a.ts', 'export const x = () => setInterval(f, 1);'],
  ['impure', 'src/blending/a.ts', "export const x = () => fetch('./x');"],
  ['impure', 'src/blending/a.ts', "export const x = localStorage.getItem('x');"],
  ['impure', 'src/blending/a.ts', 'export const x = window.name;'],
  ['impure', 'src/blending/a.ts', "export const x = `${document.title}`;"],
  ['impure', 'src/blending/a.ts', 'export const x = String.raw`${Date.now()}`;'],
  ['too long', 'src/units/a.ts', 'export {};\n'.repeat(301)],
  ['forbidden words', 'src/ui/a.tsx', 'export const A = () => <p>This is OK to fill.</p>;'],
  ['forbidden words', 'src/blending/messages.ts', "export const x = 'It is safe to open the valve.';"],
  ['forbidden words', 'src/blending/messages.ts', 'export const x = (g: string) => `${g} is safe here`;'],
  ['forbidden words', 'src/ui/a.tsx', 'export const A = () => <p title="Safe">x</p>;'],
  ['forbidden words', 'src/ui/a.tsx', 'export const A = () => <p>{x} ppm</p>;'],
];

describe('the checker', () => {
  it.each(planted)('finds "%s" planted in %s: %s', (kind, path, text) => {
    expect(violations([{ path, text }]).map((violation) => violation.kind)).toContain(kind);
  });

  it('finds folders of a layer that need each other, over any number of steps', () => {
    const found = violations([
      { path: 'src/blending/plan/a.ts', text: "import { b } from '../steps/b.ts';" },
      { path: 'src/blending/steps/b.ts', text: "import { c } from '../hazards/c.ts';" },
      { path: 'src/blending/hazards/c.ts', text: "import { a } from '../plan/a.ts';" },
      { path: 'src/blending/recipe/d.ts', text: "import { a } from '../plan/a.ts';" },
    ]);
    expect(found.map(({ kind, path }) => [kind, path])).toEqual([
      ['folder cycle', 'src/blending/plan'], ['folder cycle', 'src/blending/steps'], ['folder cycle', 'src/blending/hazards'],
    ]);
  });

  it.each<[path: string, text: string]>([
    ['src/main.tsx', "import { createRoot } from 'react-dom/client'; import { a } from './thermo/index.ts'; import { b } from './ui/index.ts';"],
    ['src/ui/tasks/order/a.tsx', "import { x } from '../../../state/index.ts'; import type { Y } from '../../../units/index.ts';"],
    ['src/ui/charts/ladder.tsx', "import { Bar } from 'recharts'; import './ladder.css';"],
    ['src/ui/bindings/use.ts', "import { useStore } from 'zustand';"],
    ['src/thermo/model/compile.ts', "import { x } from '../data/x.ts'; import { y } from '../terms/y.ts';"],
    ['src/blending/recipe/a.ts', '// Date and window in a comment\nexport const x = (document: Doc) => document.title + job.window + Math.exp(1);'],
    ['src/blending/recipe/a.ts', "export interface X { readonly location: string; performance: number } export const x: X = { location: 'Date', performance: 1 };"],
    ['src/blending/plan/a.ts', "import type { X } from '../hazards/x.ts';"],
    ['src/ui/a.tsx', 'export const A = () => <p>ppm is taken as µmol/mol; read the safety note.</p>;'],
    ['src/blending/recipe/a.ts', 'export const pattern = String.raw`(?:%|ppm|ppb)`;'],
    ['src/thermo/data/long.ts', 'export {};\n'.repeat(500)],
  ])('lets %s be: %s', (path, text) => {
    expect(violations([{ path, text }])).toEqual([]);
  });

  it('lets types of two folders refer to each other', () => {
    expect(violations([
      { path: 'src/blending/plan/a.ts', text: "import { type B, b } from '../hazards/b.ts';" },
      { path: 'src/blending/hazards/b.ts', text: "import type { A } from '../plan/a.ts';" },
    ])).toEqual([]);
  });
});
