/** Assembles the published records of a list of gases into one mixture. */
import type { GasId } from '../data/gases.ts';
import { Mixture } from '../mixture/mixture.ts';
import type { PairDeparture } from '../mixture/mixture.ts';
import { reducingTemperature, reducingVolume } from '../mixture/reducing.ts';
import type { ReducingPair } from '../mixture/reducing.ts';
import type { PairOrigin } from '../records.ts';
import { buildTermTable } from '../terms/term-table.ts';
import type { Term } from '../terms/term-table.ts';
import { cubicParameters, meanParameters, publishedPair } from './pairs.ts';
import type { PairSource, PublishedPair } from './pairs.ts';
import { pureGas } from './pure-gas.ts';
import type { PureGas } from './pure-gas.ts';

/** A pair of the mixture with where its parameters come from. */
export interface CompiledPair extends ReducingPair {
  readonly origin: PairOrigin;
}

/** A mixture together with what is known about its gases and pairs. */
export interface CompiledMixture {
  readonly mixture: Mixture;
  readonly gases: readonly PureGas[];
  readonly pairs: readonly CompiledPair[];
}

/** Compiles the model of these gases, in this order; a checked list whose equations are loaded. */
export function compileMixture(ids: readonly GasId[], source: PairSource = publishedPair): CompiledMixture {
  const gases = ids.map(pureGas);
  const pairs: CompiledPair[] = [];
  const functions: (readonly Term[])[] = gases.map(({ terms }) => terms);
  const departures: PairDeparture[] = [];
  for (let i = 0; i < ids.length; i++) {
    for (let j = i + 1; j < ids.length; j++) {
      const published = source(ids[i]!, ids[j]!);
      // The betas stay with the gas the row names first.
      const turned = published !== undefined && published.row[0] !== ids[i];
      const [first, second] = turned ? [j, i] : [i, j];
      pairs.push(compiledPair(gases, first, second, published));
      if (published?.departure === undefined) continue;
      const { factor, terms } = published.departure;
      if (!functions.includes(terms)) functions.push(terms);
      departures.push({ first, second, factor, function: functions.indexOf(terms) });
    }
  }
  const mixture = new Mixture({
    table: buildTermTable(functions),
    departures,
    reducingVolume: reducingVolume(gases.map((gas) => gas.reducingVolume), pairs),
    reducingTemperature: reducingTemperature(gases.map((gas) => gas.reducingTemperature), pairs),
    molarMasses: gases.map((gas) => gas.molarMass),
  });
  return { mixture, gases, pairs };
}

function compiledPair(gases: readonly PureGas[], first: number, second: number, published: PublishedPair | undefined): CompiledPair {
  const [a, b] = [gases[first]!, gases[second]!];
  const [betaV, gammaV, betaT, gammaT] = published === undefined ? meanParameters(a, b)
    : published.k12 === undefined ? [published.row[2], published.row[3], published.row[4], published.row[5]]
      : cubicParameters(a, b, published.k12);
  return { first, second, betaV, gammaV, betaT, gammaT, origin: published?.row[6] ?? 'mean' };
}
