import { becauseOf } from './words.ts';
import type { Words } from './words.ts';

/** Sentences of the condensation rules. */

/** What the vapour pressure rule says beside the dew point. */
export interface RuleWords {
  /** The pressure it allows, as shown; null where it gives none. */
  readonly limit: string | null;
  readonly exceeded: boolean;
}

const idealSolution =
  'By the vapour pressure rule, which treats the liquid as an ideal solution; near the critical line or with much carbon dioxide it can be wrong either way. Water below 0 °C is judged against ice.';

const byModel = 'By the dew point of the gas model, tested against every phase that could form.';

const besideRule = ({ limit, exceeded }: RuleWords): string =>
  (limit === null
    ? 'The vapour pressure rule gives no figure here.'
    : `The vapour pressure rule, Σ x p/p_sat, allows ${limit} and is ${exceeded ? 'exceeded' : 'kept'}.`);

const freezing = (freezes: boolean): string =>
  (freezes ? ' What forms is below its triple point: it may freeze out earlier, which the model does not know.' : '');

/** `carbon dioxide`, or `ice`. */
export const formingName = (name: string, ice: boolean): string => (ice ? 'ice' : name);

export const coldestNotStated = (): Words => ({
  title: 'Coldest storage temperature not stated',
  detail: 'Whether a component condenses in storage or transport cannot be judged.',
  remedy: 'Enter the lowest temperature that the cylinder will see.',
});

export const storageDew = (figure: string, limit: string, at: string, forming: string, rule: RuleWords, freezes: boolean): Words => ({
  title: `Would condense in storage: filled to ${figure}, largest fill for ${at} ${limit}`,
  detail: `Mostly ${forming} would leave the gas, and come back late. ${byModel} ${besideRule(rule)}${freezing(freezes)}`,
  remedy: 'Lower the fill pressure or the content, or guarantee a warmer storage; warm and roll the cylinder before use if it was colder.',
});

export const storageDewNear = (figure: string, limit: string, at: string, forming: string, rule: RuleWords, freezes: boolean): Words => ({
  title: `Near condensation in storage: filled to ${figure}, largest fill for ${at} ${limit}`,
  detail: `Mostly ${forming} would form first. 50 to 70 % of the limit, or some kelvins, are the usual margin. ${byModel} ${besideRule(rule)}${freezing(freezes)}`,
  remedy: 'Lower the fill pressure somewhat, or guarantee a warmer storage.',
});

export const storageSlightlyColder = (figure: string, at: string, colder: string, rule: RuleWords): Words => ({
  title: `Condenses a little below ${at}`,
  detail: `Filled to ${figure} it stays gas at ${at}, but no longer at ${colder}. ${byModel} ${besideRule(rule)}`,
  remedy: 'Lower the fill pressure somewhat, or guarantee a warmer storage.',
});

export const storageRuleOnly = (figure: string, limit: string, at: string): Words => ({
  title: `Above the vapour pressure rule in storage: filled to ${figure}, limit for ${at} ${limit}`,
  detail: `By the dew point of the gas model it stays gas there: a compressed gas holds more vapour than the rule allows. The rule is the usual practice, and close to the warmest dew point a small error of the model decides.`,
  remedy: 'Lower the fill pressure or the content to keep the rule, or have the dew point confirmed.',
});

export const storageDewBelow = (figure: string, limit: string, at: string, forming: string, rule: RuleWords, freezes: boolean): Words => ({
  title: `Largest fill for ${at}: ${limit}`,
  detail: `Filled to ${figure}. Beyond the limit mostly ${forming} would form. ${byModel} ${besideRule(rule)}${freezing(freezes)}`,
  remedy: '',
});

export const storageNoDew = (at: string, searched: string, rule: RuleWords): Words => ({
  title: `Stays gas at ${at}`,
  detail: `No dew point up to ${searched} there. ${byModel} ${besideRule(rule)}`,
  remedy: '',
});

export const storageCondenses = (figure: string, limit: string, at: string): Words => ({
  title: `Would condense in storage: ${figure} at ${at}, limit ${limit}`,
  detail: `Liquid would leave the gas lean in the condensed component, and rich later. ${idealSolution}`,
  remedy: 'Lower the fill pressure or the content, or guarantee a warmer storage; warm and roll the cylinder before use if it was colder.',
});

export const storageNear = (figure: string, limit: string, at: string): Words => ({
  title: `Near condensation in storage: ${figure} at ${at}, limit ${limit}`,
  detail: `Above 70 % of the limit; 50 to 70 % is the usual margin. ${idealSolution}`,
  remedy: 'Lower the fill pressure somewhat, or guarantee a warmer storage.',
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

export const stepNear = (step: number, figure: string, limit: string, at: string): Words => ({
  title: `Near condensation at step ${step}: ${figure} at ${at}, limit ${limit}`,
  detail: `Above 70 % of the limit. ${idealSolution}`,
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
