import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { run } from '../../src/headless/run.ts';

const folder = mkdtempSync(join(tmpdir(), 'fillwright-'));
afterAll(() => rmSync(folder, { recursive: true }));

/** Runs a command on a file with the given text. */
function onFile(command: string, text: string, ...flags: string[]) {
  const file = join(folder, 'input.json');
  writeFileSync(file, text);
  return answerOf([command, ...flags, file]);
}

function answerOf(args: readonly string[]) {
  const { output, exitCode } = run(args);
  return { exitCode, answer: JSON.parse(output) as Record<string, unknown> & { reason: Record<string, unknown> } };
}

const exampleText = readFileSync(new URL('../fixtures/recipes/example.json', import.meta.url), 'utf8');

describe('the command line', () => {
  it.each([[[]], [['plan']], [['properties']], [['weigh', 'file']], [['toString', 'file']], [['plan', 'one', 'two']]])('%j shows how it is used', (args) => {
    expect(answerOf(args)).toMatchObject({ exitCode: 2, answer: { ok: false, reason: { code: 'usage', message: expect.stringContaining('npm run') as string } } });
  });

  it('says which file it cannot read', () => {
    const { exitCode, answer } = answerOf(['plan', join(folder, 'nowhere.json')]);
    expect(exitCode).toBe(2);
    expect(answer.reason).toMatchObject({ code: 'file-not-read', message: expect.stringContaining('nowhere.json') as string });
    expect(answerOf(['plan', folder]).answer.reason.code).toBe('file-not-read');
  });

  it.each(['plan', 'properties'])('%s refuses a flag it does not know, and a constant', (command) => {
    expect(onFile(command, '[]', '--fast')).toMatchObject({ exitCode: 2, answer: { reason: { code: 'flag-unknown', flag: '--fast' } } });
    expect(onFile(command, '[]', '--gas-constant', '8.3')).toMatchObject({ exitCode: 2, answer: { reason: { code: 'flag-unknown', flag: '--gas-constant=8.3' } } });
  });

  it('takes the flag before or after the file, with a space or an equals sign', () => {
    const file = join(folder, 'recipe.json');
    writeFileSync(file, exampleText);
    const constantOf = (args: readonly string[]): unknown =>
      (answerOf(args).answer as { model?: { gasConstant_J_per_molK?: number } }).model?.gasConstant_J_per_molK;
    expect(constantOf(['plan', file])).toBe(8.314462618);
    expect(constantOf(['plan', file, '--gas-constant', 'gerg2008'])).toBe(8.314472);
    expect(constantOf(['plan', '--gas-constant=gerg2008', file])).toBe(8.314472);
    expect(constantOf(['plan', '--gas-constant', 'codata', file])).toBe(8.314462618);
  });
});
