/** Runs before every test file: the tests see the program as it is a moment after its start, with all equations loaded. */
import { loadAllGases } from '../src/thermo/index.ts';

await loadAllGases();
