/** Assembles the published records of a list of gases into one mixture. */
import type { GasId } from '../data/gases.ts';
import { departures } from '../data/kunz-wagner-2012/departures.ts';
import { pairRows } from '../data/kunz-wagner-2012/pairs.ts';
import { pureEquation } from '../data/kunz-wagner-2012/pure.ts';
import { Mixture } from '../mixture/mixture.ts';
import type { PairDeparture } from '../mixture/mixture.ts';
import { reducingTemperature, reducingVolume } from '../mixture/reducing.ts';
import type { ReducingPair } from '../mixture/reducing.ts';
import type { DepartureFunction, PairOrigin } from '../records.ts';
import { buildTermTable, departureTerms, pureTerms } from '../terms/term-table.ts';

/** A pair of the mixture with where its parameters come from. */
export interface CompiledPair extends ReducingPair {
  readonly origin: PairOrigin;
}

/** A mixture together with what is known about its pairs. */
export interface CompiledMixture {
  readonly mixture: Mixture;
  readonly pairs: readonly CompiledPair[];
}

/** Compiles the model of these gases, in this order; a checked list. */
export function compileMixture(gases: readonly GasId[]): CompiledMixture {
  const equations = gases.map(pureEquation);
  const pairs = pairsOf(gases);
  const { functions, departures: pairDepartures } = departuresOf(gases);
  const mixture = new Mixture({
    table: buildTermTable([...equations.map(pureTerms), ...functions.map(departureTerms)]),
    departures: pairDepartures,
    reducingVolume: reducingVolume(equations.map((equation) => 1e-3 / equation.criticalDensity_mol_per_dm3), pairs),
    reducingTemperature: reducingTemperature(equations.map((equation) => equation.criticalTemperature_K), pairs),
    molarMasses: equations.map((equation) => equation.molarMass_g_per_mol * 1e-3),
  });
  return { mixture, pairs };
}

/** The pairs of the list by position; the betas stay with the gas the row names first. */
function pairsOf(gases: readonly GasId[]): CompiledPair[] {
  const pairs: CompiledPair[] = [];
  for (const [firstGas, secondGas, betaV, gammaV, betaT, gammaT, origin] of pairRows) {
    const first = gases.indexOf(firstGas);
    const second = gases.indexOf(secondGas);
    if (first < 0 || second < 0) continue;
    pairs.push({ first, second, betaV, gammaV, betaT, gammaT, origin });
  }
  return pairs;
}

/** The departure functions the list needs, each once, and the pairs that use them. */
function departuresOf(gases: readonly GasId[]): { functions: DepartureFunction[]; departures: PairDeparture[] } {
  const functions: DepartureFunction[] = [];
  const found: PairDeparture[] = [];
  for (const departure of departures) {
    const first = gases.indexOf(departure.first);
    const second = gases.indexOf(departure.second);
    if (first < 0 || second < 0) continue;
    if (!functions.includes(departure.function)) functions.push(departure.function);
    found.push({ first, second, factor: departure.factor, function: gases.length + functions.indexOf(departure.function) });
  }
  return { functions, departures: found };
}
