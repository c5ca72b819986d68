/**
 * Runs before every test file: the tests see the program as it is a moment after
 * its start, with equations, rules and search loaded; those of the lower layers
 * only with what these layers have.
 */
import { expect } from 'vitest';

const file = expect.getState().testPath ?? '';
if (file.includes('/tests/thermo/')) await (await import('../src/thermo/index.ts')).loadAllGases();
else if (!file.includes('/tests/units/')) await (await import('../src/blending/index.ts')).loadRest();
