import { becauseOf } from './words.ts';
import type { Words } from './words.ts';

/** Sentences about condensation while the cylinder is filled. */

export const idealSolution =
  'By the vapour pressure rule, which treats the liquid as an ideal solution; near the critical line or with much carbon dioxide it can be wrong either way. Water below 0 °C is judged against ice.';

export const byModel = 'By the dew point of the gas model, tested against every phase that could form.';

/** `carbon dioxide`, or `ice`. */
export const formingName = (name: string, ice: boolean): string => (ice ? 'ice' : name);


/** `where`: `at step 2`, `before filling`, `in the finished gas`. */
export const stateSeparates = (where: string, figure: string, at: string, forming: string | null): Words => ({
  title: `Would condense ${where}: ${figure} at ${at}`,
  detail: `${forming === null ? 'No gas of that pressure exists' : `The gas separates, and mostly ${forming} forms`}: neither stop nor mass balance nor filling ratio would mean what the sheet says. ${byModel}`,
  remedy: 'Add this component at a lower total pressure, as a premix, or warm the cylinder.',
});

export const stepCondenses = (step: number, figure: string, limit: string, at: string): Words => ({
  title: `Would condense at step ${step}: ${figure} at ${at}, limit ${limit}`,
  detail: `The stop would be reached with liquid in the cylinder, and neither stop nor mass balance would mean what the sheet says. ${idealSolution}`,
  remedy: 'Add this component at a lower total pressure, as a premix, or warm the cylinder.',
});

export const stepNear = (step: number, figure: string, limit: string, at: string, share: string): Words => ({
  title: `Near condensation at step ${step}: ${figure} at ${at}, limit ${limit}`,
  detail: `Above ${share} of the limit. ${idealSolution}`,
  remedy: 'Add slowly, and keep cylinder and line from getting colder than planned.',
});

export const stepAboveRule = (step: number, figure: string, limit: string, at: string): Words => ({
  title: `Above the vapour pressure rule at step ${step}: ${figure} at ${at}, limit ${limit}`,
  detail: `By the stability test of the gas model it stays gas there, because a compressed gas holds more vapour than the rule allows; a colder line or cylinder may still condense it.`,
  remedy: 'Add slowly, and keep cylinder and line from getting colder than planned.',
});

export const stepNotComputed = (step: number, at: string, code: string): Words => ({
  title: `Condensation at step ${step} (${at}) not computed`,
  detail: becauseOf(code),
  remedy: 'Judge this step by other means before filling.',
});
