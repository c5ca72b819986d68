import { run } from './run.ts';

/* Entry of the command line: the arguments in, one JSON value out. */
const { output, exitCode } = run(process.argv.slice(2));
process.stdout.write(`${output}\n`);
process.exitCode = exitCode;
