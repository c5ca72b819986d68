/** README.md and DEVELOPERS.md are tested like code: what they show runs, and what they name exists. */
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { decodeRecipeFile, planRecipe } from '../src/blending/index.ts';
import { run } from '../src/headless/run.ts';
import { valueOf } from './blending/lab.ts';

const root = fileURLToPath(new URL('../', import.meta.url));
const textOf = (file: string): string => readFileSync(join(root, file), 'utf8');
const readme = textOf('README.md');

/** The text of the block of the README whose fence carries this label. */
function block(label: string): string {
  const found = readme.split(`\`\`\`json ${label}\n`)[1]?.split('```\n')[0];
  if (found === undefined) throw new Error(`README.md has no block labelled "${label}"`);
  return found;
}

const shown = (label: string): unknown => JSON.parse(block(label));

/** Every part of `part` is in `whole`, numbers within 1e-9: their last digits differ between machines. */
function expectPart(part: unknown, whole: unknown, path: string): void {
  if (typeof part === 'number') {
    expect(typeof whole, path).toBe('number');
    expect(Math.abs((whole as number) - part), path).toBeLessThanOrEqual(1e-9 * Math.abs(part));
  } else if (typeof part === 'object' && part !== null) {
    expect(typeof whole, path).toBe('object');
    for (const [key, value] of Object.entries(part)) expectPart(value, (whole as Readonly<Record<string, unknown>>)[key], `${path}.${key}`);
  } else expect(whole, path).toBe(part);
}

/** Runs the README's command, `npm run -s NAME -- FILE`, in this process. */
function runAsWritten(name: string, file: string, place: string): unknown {
  expect(readme).toContain(`npm run -s ${name} -- ${file}\n`);
  const { output, exitCode } = run([name, place]);
  expect(exitCode).toBe(0);
  return JSON.parse(output);
}

describe('the README', () => {
  it('shows the example recipe as it is, and the example can be planned', () => {
    expect(block('example.json')).toBe(textOf('tests/fixtures/recipes/example.json'));
    const { recipe } = valueOf(decodeRecipeFile(block('example.json')));
    expect(planRecipe(recipe).ok).toBe(true);
  });

  it('shows what the plan command answers', () => {
    const file = 'tests/fixtures/recipes/example.json';
    expectPart(shown('plan, in part'), runAsWritten('plan', file, join(root, file)), 'plan');
  });

  it('shows what the properties command answers, all of it', () => {
    const folder = mkdtempSync(join(tmpdir(), 'readme-'));
    const place = join(folder, 'states.json');
    writeFileSync(place, block('states.json'));
    const answer = runAsWritten('properties', 'states.json', place);
    rmSync(folder, { recursive: true });
    expectPart(shown('properties'), answer, 'shown');
    expectPart(answer, shown('properties'), 'answered');
  });

  it('names the pictures of the tour in the order in which they are looked at', () => {
    const pictures = [...readme.matchAll(/!\[[^\]]+\]\(\.ci\/tour\/([a-z]+)\.png\)/g)].map(([, name]) => name);
    expect(pictures).toEqual(['opening', 'order', 'hold', 'route', 'parents', 'stock', 'mixing', 'limits', 'sheet']);
  });
});

describe.each(['README.md', 'DEVELOPERS.md', 'SAFETY.md'])('%s', (file) => {
  const text = textOf(file);

  it('links to nothing that is not there', () => {
    const targets = [...text.matchAll(/\]\(([^)#]+)[^)]*\)/g)].map(([, target]) => target!).filter((target) => !target.startsWith('http'));
    expect(targets.filter((target) => !existsSync(join(root, target)))).toEqual([]);
  });

  it('names no file or folder that is not there', () => {
    const named = [...text.matchAll(/`((?:src|tests|public|\.ci)\/[^`\s]*)`/g)].map(([, path]) => path!).filter((path) => !/[<*…]/.test(path));
    expect(named.filter((path) => !existsSync(join(root, path)))).toEqual([]);
  });
});
