import { formatAmountFraction, formatPressureInFull, formatTemperature, fraction, kelvin, pascal } from '../../units/index.ts';
import type { Pascal } from '../../units/index.ts';
import type { GasId, ThermoReason } from '../../thermo/index.ts';
import { gasLabel } from '../gases.ts';
import type { MixingProblem } from '../mixing/mixing.ts';
import type { NearestComposition, RecipeProblem } from '../recipe/problem.ts';
import { entrySentence } from './entry.ts';

/** Why a recipe is not planned, in one or two sentences that say what to do. */
export function recipeSentence(problem: RecipeProblem): string {
  switch (problem.code) {
    case 'entry':
      return entrySentence(problem.problem);
    case 'gas-unknown':
      return `“${problem.text.trim()}” is not one of the gases that this program can compute.`;
    case 'gas-missing':
      return 'Name a gas: by name, formula or CAS number.';
    case 'gas-repeated':
      return `${formula(problem.gas)} stands here twice: give one line with its whole amount.`;
    case 'no-components':
      return 'Enter at least one component.';
    case 'two-balances':
      return 'Only one gas can be the balance.';
    case 'sum-not-one':
      return `The amounts add up to ${percent(problem.sum)}, not to 100 %: make one gas the balance, or correct an amount.`;
    case 'sum-above-one':
      return `The amounts add up to ${percent(problem.sum)} and leave nothing for the balance gas.`;
    case 'fraction-zero':
      return 'The amount must be above zero; remove the line if the gas is not wanted.';
    case 'limit-in-order':
      return 'A “<” limit belongs in a purity table; state the amount that is there or wanted.';
    case 'not-positive':
      return 'The value must be above zero.';
    case 'barometer-unlikely':
      return `The air pressure must lie between ${hectopascal(problem.lowest)} and ${hectopascal(problem.highest)} absolute: look at its number and its unit.`;
    case 'origin-missing':
      return 'Say where and when the laboratory read its value: without both it cannot be checked.';
    case 'number-alone':
      return `“${problem.text.trim()}” is more than a number: the unit is that of the published value.`;
    case 'value-beyond':
      return `The value must lie between ${String(problem.lowest)} and ${String(problem.highest)}.`;
    case 'room-unlikely':
      return `The room temperature must lie between ${formatTemperature(problem.lowest)} and ${formatTemperature(problem.highest)}: look at its number and its unit.`;
    case 'no-parents':
      return 'Enter the parent gases to fill from, or let Stock, “What can be made”, choose them.';
    case 'not-a-day':
      return 'Write the day as 2026-12-01.';
    case 'not-a-count':
      return `Enter a whole number from 1 to ${String(problem.most)}.`;
    case 'share-outside':
      return 'The share that goes in early must lie between 0 and 100 %.';
    case 'purge-not-above':
      return 'Each cycle must fill to a pressure above the one it goes down to.';
    case 'purge-without-parent':
      return 'Choose the parent gas that purges.';
    case 'purge-without-end':
      return 'State how many cycles, or how much of the old gas may be left.';
    case 'purge-never-ends':
      return `After ${String(problem.cycles)} cycles ${amount(problem.oldGas)} of the old gas is still there: pump lower or fill higher in each cycle.`;
    case 'key-repeated':
      return `The key “${problem.key}” is used twice.`;
    case 'component-without-parent':
      return `No parent holds ${formulas(problem.gases)}: add one that does. ${nearestSentence(problem.nearest)}`;
    case 'cannot-be-made':
      return `These parents cannot make the order: ${formulas(problem.gases)} cannot be met together with the rest. ${nearestSentence(problem.nearest)}`;
    case 'residual-in-the-way':
      return `What is left in the cylinder is in the way of ${formulas(problem.gases)}. ${ventSentence(problem.ventTo, problem.barometer)} Conditioning, under Route, does the arithmetic of a purge.`;
    case 'fill-pressure-too-low':
      return `The cylinder already holds ${bar(problem.residualPressure, problem.barometer)} at the fill temperature: nothing can be added up to the fill pressure asked for.`;
    case 'no-state':
      return `No answer for the ${problem.where}: ${thermoSentence(problem.reason)}${condensesSentence(problem.condenses ?? null)}`;
  }
}

/** A liquefied blend is refused as a whole: neither stop nor filling ratio of a gas would hold for it. */
function condensesSentence(gas: GasId | null): string {
  return gas === null ? '' : ` ${formula(gas)} condenses first: part of the blend would be liquid, for which no stop and no filling ratio is given. Lower the pressure or the content, or raise the temperature.`;
}

/** Why the thermodynamic model has no answer. */
export function thermoSentence(reason: ThermoReason): string {
  switch (reason.code) {
    case 'no-gas-root':
      return `at ${formatTemperature(kelvin(reason.temperature))} it condenses before it reaches that pressure.`;
    case 'no-liquid-root':
      return 'it has no liquid state there.';
    case 'not-converged':
      return `the calculation did not settle after ${String(reason.iterations)} steps.`;
    case 'equation-breaks-down':
      return 'the state is so dense that the equation no longer describes a gas.';
    case 'temperature-invalid':
      return 'the temperature is not one that can be computed with.';
    case 'pressure-invalid':
      return 'the pressure is not one that can be computed with.';
    case 'density-invalid':
      return 'there is no gas to compute with.';
    case 'not-compared':
      return 'no comparison of models says how well it is known.';
    case 'unknown-gas':
      return `“${reason.gas}” is not in the model.`;
    case 'equations-not-loaded':
      return `the equations of ${formulas(reason.gases)} are still being loaded. If this stays, load the page again.`;
    case 'no-gases':
      return 'no gas is named.';
    case 'duplicate-gas':
      return `“${reason.gas}” is named twice.`;
    case 'composition-length':
    case 'fraction-invalid':
    case 'fractions-do-not-sum':
      return 'the composition does not add up to one.';
  }
}

/** Why the entropy and Gibbs energy of mixing cannot be stated. */
export function mixingSentence(problem: MixingProblem, nameOf: (source: string) => string): string {
  return `Not computed: for ${nameOf(problem.source)} ${thermoSentence(problem.reason)} State the pressure at which it is a gas at the fill temperature.`;
}

function nearestSentence({ components }: NearestComposition): string {
  const parts = components
    .filter(({ nominal, fraction: x }) => nominal !== null || x >= 1e-6)
    .map(({ gas, fraction: x }) => `${amount(x)} ${formula(gas)}`);
  return `The nearest that can be made is ${parts.join(', ')}.`;
}

function ventSentence(ventTo: Pascal | null, barometer: Pascal): string {
  if (ventTo === null) return 'Evacuate the cylinder first.';
  // Rounded down: what is shown must be low enough.
  const reachable = ventTo > barometer
    ? `Vent it to ${bar(pascal(Math.max(ventTo - 500, barometer)), barometer)} or less`
    : `Evacuate it to ${absolute(pascal(Math.max(ventTo - 50, 0)), barometer)} or less`;
  return `${reachable}, then enter what is left.`;
}

function absolute(pressure: Pascal, barometer: Pascal): string {
  return formatPressureInFull(pressure, { unit: 'bar', reference: 'absolute', barometer, resolution: 1e2 });
}

function bar(pressure: Pascal, barometer: Pascal): string {
  return formatPressureInFull(pressure, { unit: 'bar', reference: 'gauge', barometer, resolution: 1e3 });
}

function hectopascal(pressure: Pascal): string {
  return `${String(Math.round(pressure / 100))} hPa`;
}

function amount(x: number): string {
  const { number, unit } = formatAmountFraction(fraction(x), 4);
  return `${number} ${unit}`;
}

function percent(x: number): string {
  const { number, unit } = formatAmountFraction(fraction(x), 6);
  return `${number} ${unit}`;
}

function formula(gas: GasId): string {
  return gasLabel(gas).formula;
}

function formulas(gases: readonly GasId[]): string {
  return gases.map(formula).join(', ');
}
