import type { DewReason } from '../../thermo/index.ts';
import type { Forming } from '../phase/forming.ts';
import { gasLabel } from '../gases.ts';
import { thermoSentence } from './recipe.ts';

/** What would form, in words: `ice`, `liquid, mostly propane`. */
export function formingText({ gas, ice }: Forming): string {
  return ice ? 'ice' : `liquid, mostly ${gasLabel(gas).name}`;
}

/** What to add where moisture forms first: the model is too kind to it, so the rule of the Checks decides. Empty for other gases. */
export function moistureCaveat({ gas }: Forming): string {
  return gas === 'water' ? ' For moisture the gas model is on the hopeful side; the vapour pressure rule in Checks decides.' : '';
}

/** Why a condensation limit has no figure. */
export function phaseSentence(reason: DewReason | { readonly code: string }): string {
  switch (reason.code) {
    case 'unstable-from-the-start':
      return 'not stated: the blend separates already at the fill temperature.';
    case 'no-dew-point':
      return 'none found.';
    default:
      return isThermoReason(reason) ? `not computed: ${thermoSentence(reason)}` : 'not computed.';
  }
}

/** Reasons of the model, which have sentences of their own. */
function isThermoReason(reason: { readonly code: string }): reason is Parameters<typeof thermoSentence>[0] {
  return ['no-gas-root', 'no-liquid-root', 'not-converged', 'equation-breaks-down'].includes(reason.code);
}
