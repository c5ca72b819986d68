import { readFileSync } from 'node:fs';
import { planCommand } from './plan-command.ts';
import { propertiesCommand } from './properties-command.ts';

/** What a command answers: text for standard output and the exit code. */
export interface CommandAnswer {
  readonly output: string;
  readonly exitCode: 0 | 1 | 2;
}

const COMMANDS: Readonly<Record<string, (input: string, flags: readonly string[]) => CommandAnswer>> = {
  plan: planCommand,
  properties: propertiesCommand,
};

export const USAGE = 'usage: npm run -s (plan|properties) -- [--gas-constant gerg2008] FILE   (- reads standard input), or npm run -s proof';

/** Runs one command line; everything it prints is one JSON value. */
export function run(args: readonly string[]): CommandAnswer {
  const [name, ...rest] = args;
  const command = name !== undefined && Object.hasOwn(COMMANDS, name) ? COMMANDS[name] : undefined;
  const { files, flags } = splitArguments(rest);
  const [file] = files;
  if (command === undefined || file === undefined || files.length > 1) {
    return { output: JSON.stringify({ ok: false, reason: { code: 'usage', message: USAGE } }), exitCode: 2 };
  }
  const text = readInput(file);
  return text === null
    ? { output: JSON.stringify({ ok: false, reason: { code: 'file-not-read', message: `cannot read ${file}` } }), exitCode: 2 }
    : command(text, flags);
}

/** `--gas-constant gerg2008` and `--gas-constant=gerg2008` are flags; the rest are files. */
function splitArguments(args: readonly string[]): { files: string[]; flags: string[] } {
  const files: string[] = [];
  const flags: string[] = [];
  for (let i = 0; i < args.length; i++) {
    const argument = args[i]!;
    if (argument === '--gas-constant') flags.push(`--gas-constant=${args[++i] ?? ''}`);
    else if (argument.startsWith('--')) flags.push(argument);
    else files.push(argument);
  }
  return { files, flags };
}

function readInput(file: string): string | null {
  try {
    return readFileSync(file === '-' ? 0 : file, 'utf8');
  } catch (error) {
    if (error instanceof Error && 'code' in error) return null;
    throw error;
  }
}
