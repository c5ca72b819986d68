import { byModel, idealSolution } from './condensation.ts';
import { becauseOf } from './words.ts';
import type { Words } from './words.ts';

/** Sentences about condensation in storage. */

/** What the vapour pressure rule says beside the dew point. */
export interface RuleWords {
  /** The pressure it allows, as shown; null where it gives none. */
  readonly limit: string | null;
  readonly exceeded: boolean;
}

const besideRule = ({ limit, exceeded }: RuleWords): string =>
  (limit === null
    ? 'The vapour pressure rule gives no figure here.'
    : `The vapour pressure rule, Σ x p/p_sat, allows ${limit} and is ${exceeded ? 'exceeded' : 'kept'}.`);

const freezing = (freezes: boolean): string =>
  (freezes ? ' What forms is below its triple point: it may freeze out earlier, which the model does not know.' : '');

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

export const storageDewNear = (figure: string, limit: string, at: string, forming: string, rule: RuleWords, freezes: boolean, share: string): Words => ({
  title: `Near condensation in storage: filled to ${figure}, largest fill for ${at} ${limit}`,
  detail: `Mostly ${forming} would form first. Said above ${share} of the limit; 50 to 70 % of it, or some kelvins, are the usual margin. ${byModel} ${besideRule(rule)}${freezing(freezes)}`,
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

export const storageNear = (figure: string, limit: string, at: string, share: string): Words => ({
  title: `Near condensation in storage: ${figure} at ${at}, limit ${limit}`,
  detail: `Above ${share} of the limit; 50 to 70 % is the usual margin. ${idealSolution}`,
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
