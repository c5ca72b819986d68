import { loadRest } from '../blending/index.ts';
import { proofCommand } from './proof-command.ts';
import { run, USAGE } from './run.ts';

/* Entry of the command line: the arguments in, one JSON value out. */
await loadRest({ patient: true });
const args = process.argv.slice(2);
const { output, exitCode } = args[0] === 'proof' ? await prove(args.length === 1) : run(args);
process.stdout.write(`${output}\n`);
process.exitCode = exitCode;

/** The proof takes no file and no flag. */
function prove(plainly: boolean): ReturnType<typeof proofCommand> | ReturnType<typeof run> {
  return plainly
    ? proofCommand(`Fillwright ${__PROGRAM_VERSION__}`)
    : { output: JSON.stringify({ ok: false, reason: { code: 'usage', message: USAGE } }), exitCode: 2 };
}
