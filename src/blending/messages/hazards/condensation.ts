import { becauseOf } from './words.ts';
import type { Words } from './words.ts';

/** Sentences of the condensation rules. */

const idealSolution =
  'By the vapour pressure rule, which treats the liquid as an ideal solution; near the critical line or with much carbon dioxide it can be wrong either way. Water below 0 °C is judged against ice.';

export const coldestNotStated = (): Words => ({
  title: 'Coldest storage temperature not stated',
  detail: 'Whether a component condenses in storage or transport cannot be judged.',
  remedy: 'Enter the lowest temperature that the cylinder will see.',
});

export const storageCondenses = (figure: string, limit: string, at: string): Words => ({
  title: `Would condense in storage: ${figure} at ${at}, limit ${limit}`,
  detail: `Liquid would leave the gas lean in the condensed component, and rich later. ${idealSolution}`,
  remedy: 'Lower the fill pressure or the content, or guarantee a warmer storage; warm and roll the cylinder before use if it was colder.',
});

export const storageNear = (figure: string, limit: string, at: string): Words => ({
  title: `Near condensation in storage: ${figure} at ${at}, limit ${limit}`,
  detail: `Above 70 % of the limit; 50 to 70 % is the usual margin. ${idealSolution}`,
  remedy: 'Lower the fill pressure somewhat, or check with a dew point calculation.',
});

export const storageBelow = (figure: string, limit: string, at: string): Words => ({
  title: `Condensation limit in storage ${limit} at ${at}`,
  detail: `The closed cylinder stands at ${figure} there. ${idealSolution}`,
  remedy: '',
});

export const storageNotComputed = (at: string, code: string): Words => ({
  title: `Condensation at ${at} not computed`,
  detail: becauseOf(code),
  remedy: 'Have the dew point of this mixture calculated by other means, or keep the cylinder warmer.',
});

export const storageNoGas = (at: string): Words => ({
  title: `No gas state at ${at}`,
  detail: 'The gas model finds no gas-like state of the closed cylinder at the coldest storage temperature: it would condense.',
  remedy: 'Lower the fill pressure or the content, or guarantee a warmer storage.',
});

export const stepCondenses = (step: number, figure: string, limit: string, at: string): Words => ({
  title: `Would condense at step ${step}: ${figure} at ${at}, limit ${limit}`,
  detail: `The stop would be reached with liquid in the cylinder, and neither stop nor mass balance would mean what the sheet says. ${idealSolution}`,
  remedy: 'Add this component at a lower total pressure, as a premix, or warm the cylinder.',
});

export const stepNear = (step: number, figure: string, limit: string, at: string): Words => ({
  title: `Near condensation at step ${step}: ${figure} at ${at}, limit ${limit}`,
  detail: `Above 70 % of the limit. ${idealSolution}`,
  remedy: 'Add slowly, and keep cylinder and line from getting colder than planned.',
});

export const stepNotComputed = (step: number, at: string, code: string): Words => ({
  title: `Condensation at step ${step} (${at}) not computed`,
  detail: becauseOf(code),
  remedy: 'Judge this step by other means before filling.',
});
