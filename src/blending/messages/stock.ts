import { formatAmountFraction, formatPressureInFull, fraction, pascal } from '../../units/index.ts';
import type { Pascal } from '../../units/index.ts';
import { showPercent } from '../figures.ts';
import { gasLabel } from '../gases.ts';
import type { GasId } from '../gases.ts';
import type { NearestComposition } from '../recipe/problem.ts';
import type { BenchProblem, LeftOut } from '../stock/choose/bench.ts';
import type { Impossible, Remedy, Shortage } from '../stock/choose/impossible.ts';
import type { BroughtByTrace, SetAside, UnorderedGas } from '../stock/choose/proposal.ts';
import type { KnownSupply, StoreGap } from '../supply/index.ts';
import { recipeSentence, thermoSentence } from './recipe.ts';

export { cellFaultSentence, stockFileSentence, tableSentence } from './stock-files.ts';

/** Why a parent of the stock is not considered. */
export function leftOutSentence({ name: typed, reason }: LeftOut): string {
  const name = typed.trim() === '' ? 'A parent without a name' : typed;
  switch (reason.code) {
    case 'expired': return `${name} expired on ${reason.expiry}.`;
    case 'expiry-unreadable': return `${name}: its expiry “${reason.expiry}” is not a day written as 2027-03-31, so it may have expired.`;
    case 'unreadable': return `${name} cannot be read. ${reason.problems.map(recipeSentence).join(' ')}`;
  }
}

/** Why nothing can be chosen at all. */
export function benchSentence(problem: BenchProblem): string {
  if (problem.code === 'recipe-problems') return problem.problems.map(recipeSentence).join(' ');
  const left = problem.leftOut.map(leftOutSentence).join(' ');
  return left === '' ? 'The stock has no parents.' : `The stock has no parent that can be used. ${left}`;
}

/** Why the stock cannot fill the order, what comes nearest and what would help. `nameOf` a stock key. */
export function impossibleSentences({ shortage, nearest, remedies }: Impossible, nameOf: (parent: string) => string): readonly string[] {
  return [
    shortageSentence(shortage, nameOf),
    ...(nearest === null || shortage.code === 'residual-in-the-way' || shortage.code === 'not-enough-gas' ? [] : [nearestSentence(nearest)]),
    ...(shortage.code === 'residual-in-the-way' ? [] : [remedySentence(remedies)]),
  ];
}

/** Why it is not said whether the stock can fill the order. */
export const undecidedSentence = 'It could not be decided whether the stock can fill this order: neither search came to an end. Choose the parents by hand.';

/** What is missing. */
export function shortageSentence(shortage: Shortage, nameOf: (parent: string) => string): string {
  switch (shortage.code) {
    case 'component-missing': return `No parent of the stock holds ${formulas(shortage.gases)}.`;
    case 'not-enough-gas':
      return shortage.parents.length === 0
        ? 'The parents of the stock hold too little gas for this order.'
        : `The gases are there, but not enough of them: ${shortage.parents.map(nameOf).join(', ')} cannot give what is needed at this pressure.`;
    case 'proportions': return 'The stock holds every gas of the order, but not in proportions that add up to it.';
    case 'residual-in-the-way': {
      const { ventTo, barometer } = shortage;
      const share = `At most ${amount(shortage.mayStay)} of the gas that is left in the cylinder may stay.`;
      if (ventTo === null) return `${share} Evacuate the cylinder, or purge it until less than that is left.`;
      // Rounded down: what is shown must be low enough.
      return ventTo > barometer
        ? `${share} Vent the cylinder to ${pressure(Math.max(ventTo - 500, barometer), 'gauge', barometer)} or less, or purge it.`
        : `${share} Evacuate the cylinder to ${pressure(Math.max(ventTo - 50, 0), 'absolute', barometer)} or less, or purge it.`;
    }
  }
}

function nearestSentence({ components }: NearestComposition): string {
  const parts = components
    .filter(({ nominal, fraction: x }) => nominal !== null || x >= 1e-6)
    .map(({ gas, fraction: x }) => `${amount(x)} ${formula(gas)}`);
  return `The nearest that can be made is ${parts.join(', ')}.`;
}

function remedySentence(remedies: readonly Remedy[]): string {
  const pure = remedies.filter(({ vapourPressure }) => vapourPressure === null).map(({ gas }) => gas);
  const premixed = remedies.filter(({ vapourPressure }) => vapourPressure !== null).map(({ gas }) => gas);
  if (remedies.length === 0) return 'No single pure gas would make it possible.';
  if (pure.length === 0) return `One more parent with ${either(premixed)} would do, as a premix: the vapour pressure of the pure gas is too low.`;
  return `One more parent of pure ${either(pure)} would make it possible.`;
}

/** Why a parent was set aside and the choice made again. */
export function setAsideSentence({ name, code, step, pressure: stands, stop }: SetAside, barometer: Pascal): string {
  const limit = pressure(stop, 'gauge', barometer);
  if (code === 'runs-out') return `${name} was set aside: it would fall below the stop of step ${String(step)}, ${limit}, while it gives.`;
  const figure = stands === null ? 'too low a pressure' : pressure(stands, 'gauge', barometer);
  return `${name} was set aside: it stands at ${figure}, the stop of step ${String(step)} is ${limit}.`;
}

/** An ordered gas that comes in part as a trace in a parent meant for something else. */
export function traceSentence({ gas, name, share, isLimit }: BroughtByTrace): string {
  const known = isLimit ? `; half of its limit is counted, so the true share lies between none and twice that` : '';
  return `${showPercent(share, 2)} of the ${formula(gas)} comes as a trace in ${name}${known}.`;
}

/** A gas that nobody ordered. */
export function unorderedSentence({ gas, fraction: x }: UnorderedGas): string {
  return `${amount(x)} ${formula(gas)} comes in that was not ordered.`;
}

/** Why it is not said how long a parent lasts. */
export function supplyGapSentence(gap: StoreGap, name: string): string {
  switch (gap.code) {
    case 'water-capacity-not-stated': return `${name}: not computed, the water capacity of its cylinder is not stated.`;
    case 'pressure-not-stated': return `${name}: not computed, its pressure is not stated.`;
    case 'content-not-stated': return `${name}: not computed, the mass of liquefied gas left in it is not stated.`;
    case 'liquid-without-vapour-pressure':
      return `${name}: not computed, it is called liquefied but is not one gas with a vapour pressure at its temperature.`;
    case 'state': return `${name}: not computed, ${thermoSentence(gap.reason)}`;
  }
}

/** How long a parent lasts for a batch. */
export function lastingSentence(name: string, supply: KnownSupply, barometer: Pascal): string {
  const { runsOutAt, step, stop, cylinders, cylindersBoosted } = supply;
  const boosted = cylindersBoosted === null || cylindersBoosted === cylinders
    ? '' : ` With the booster it lasts for ${String(cylindersBoosted)}.`;
  if (runsOutAt === null) return `${name} lasts for ${count(cylinders)}.${boosted}`;
  const where = step === 0 ? 'the purge' : `step ${String(step)}`;
  return `${name} runs out at cylinder ${String(runsOutAt)}: there it falls below the stop of ${where}, ${pressure(stop, 'gauge', barometer)}.${boosted}`;
}

function count(cylinders: number): string {
  return cylinders === 1 ? '1 cylinder' : `${String(cylinders)} cylinders`;
}

function pressure(absolute: number, reference: 'gauge' | 'absolute', barometer: Pascal): string {
  const resolution = reference === 'gauge' ? 1e3 : 1e2;
  return formatPressureInFull(pascal(absolute), { unit: 'bar', reference, barometer, resolution });
}

function amount(x: number): string {
  const { number, unit } = formatAmountFraction(fraction(x), 3);
  return `${number} ${unit}`;
}

function formula(gas: GasId): string {
  return gasLabel(gas).formula;
}

function formulas(gases: readonly GasId[]): string {
  return gases.map(formula).join(', ');
}

function either(gases: readonly GasId[]): string {
  return gases.map(formula).join(' or of ');
}
