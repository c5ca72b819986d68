import type { ProofGroup } from './case.ts';
import { classification } from './groups/classification.ts';
import { gergBinaries } from './groups/gerg-binaries.ts';
import { gergPoint } from './groups/gerg-point.ts';
import { gergStates } from './groups/gerg-states.ts';
import { monteCarlo } from './groups/monte-carlo.ts';
import { airTable, longEquations, pureGases } from './groups/pure-gases.ts';
import { dewPoints, vapourPressures } from './groups/saturation.ts';
import { secondVirials } from './groups/second-virials.ts';
import { weighing } from './groups/weighing.ts';
import { workedPlans } from './groups/worked-plans.ts';

/** The whole proof, in the order of the report. A group without cases (its gases are not in the program) is left out. */
export function proofGroups(): readonly ProofGroup[] {
  return [
    gergPoint(), gergBinaries(), gergStates(), pureGases(), longEquations(), airTable(), secondVirials(),
    vapourPressures(), dewPoints(), workedPlans(), weighing(), classification(), monteCarlo(),
  ].filter(({ cases }) => cases.length > 0);
}
