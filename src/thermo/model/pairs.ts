/**
 * The reducing parameters of any pair of gases: the row of a publication if there
 * is one, else the arithmetic means that GERG-2008 itself takes for the pairs it
 * predicts. In the dilute limit in nitrogen the means land near
 * corresponding-states cross virials; four ones do worse.
 */
import type { BeyondGerg } from '../data/beyond-gerg.ts';
import type { GasId } from '../data/gases.ts';
import { departures } from '../data/kunz-wagner-2012/departures.ts';
import { pairRows } from '../data/kunz-wagner-2012/pairs.ts';
import type { PairRow } from '../records.ts';
import { departureTerms } from '../terms/term-table.ts';
import type { Term } from '../terms/term-table.ts';
import { equationsBeyondGerg } from './library.ts';
import type { PureGas } from './pure-gas.ts';

/** A published row; the betas belong to its first gas. */
export interface PublishedPair {
  readonly row: PairRow<GasId>;
  /** The departure function with its factor F; the same array for every pair that shares it. */
  readonly departure?: { readonly factor: number; readonly terms: readonly Term[] };
  /** k₁₂ of the Peng–Robinson equation in the place of reducing parameters. */
  readonly k12?: number;
}

/** Finds the published row of a pair, in whichever order it stands there. */
export type PairSource = (first: GasId, second: GasId) => PublishedPair | undefined;

/** A source made of rows alone. */
export function pairSource(pairs: readonly PublishedPair[]): PairSource {
  const byName = new Map(pairs.map((pair) => [`${pair.row[0]}|${pair.row[1]}`, pair]));
  return (first, second) => byName.get(`${first}|${second}`) ?? byName.get(`${second}|${first}`);
}

let gerg2008: PairSource | undefined;
let beyondGerg: PairSource | undefined;

/** The rows of all publications that are loaded. */
export function publishedPair(first: GasId, second: GasId): PublishedPair | undefined {
  gerg2008 ??= pairSource(gerg2008Pairs());
  const beyond = equationsBeyondGerg();
  if (beyond) beyondGerg ??= pairSource([...phasePairs(beyond), ...cubicPairs(beyond)]);
  return gerg2008(first, second) ?? beyondGerg?.(first, second);
}

function gerg2008Pairs(): PublishedPair[] {
  const terms = new Map(departures.map((row) => [row.function, departureTerms(row.function)]));
  return pairRows.map((row) => {
    const found = departures.find(({ first, second }) => first === row[0] && second === row[1]);
    return found ? { row, departure: { factor: found.factor, terms: terms.get(found.function)! } } : { row };
  });
}

function phasePairs({ phasePairs: rows }: BeyondGerg): PublishedPair[] {
  return rows.flatMap(([first, seconds]) => (
    seconds.map(([second, betaT, gammaT]): PublishedPair => ({ row: [first, second, 1, 1, betaT, gammaT, 'phase'] }))));
}

function cubicPairs({ cubicPairs: rows }: BeyondGerg): PublishedPair[] {
  return rows.map(([first, second, k12]) => ({ row: [first, second, 1, 1, 1, 1, 'phase'], k12 }));
}

/** [betaV, gammaV, betaT, gammaT] of the arithmetic means of reducing volume and temperature. */
export function meanParameters(first: PureGas, second: PureGas): readonly [number, number, number, number] {
  const [vi, vj] = [first.reducingVolume, second.reducingVolume];
  const [ti, tj] = [first.reducingTemperature, second.reducingTemperature];
  return [1, (vi + vj) / 2 / ((Math.cbrt(vi) + Math.cbrt(vj)) ** 3 / 8), 1, (ti + tj) / 2 / Math.sqrt(ti * tj)];
}

/** About 1/(1 + κ): a(T) of the cubic equation grows with the critical temperature by the power 1 + κ near it, κ being 0.6 to 0.7. */
const ATTRACTION_POWER = 0.6;

/**
 * The same for a pair of cubic gases with k₁₂. One fluid with the constants of
 * the mixture has vᵢⱼ ∝ bᵢⱼ and Tᵢⱼ vᵢⱼ ∝ aᵢⱼ. The cubic mixing rule takes the
 * arithmetic mean of b and aᵢⱼ = √(aᵢaⱼ)(1 − k₁₂), hence vᵢⱼ = (vᵢ+vⱼ)/2 and
 * Tᵢⱼ = √(TᵢvᵢTⱼvⱼ)/vᵢⱼ, lowered so that the attraction falls by the factor 1 − k₁₂.
 */
export function cubicParameters(first: PureGas, second: PureGas, k12: number): readonly [number, number, number, number] {
  const [vi, vj] = [first.reducingVolume, second.reducingVolume];
  return [1, meanParameters(first, second)[1], 1, Math.sqrt(vi * vj) / ((vi + vj) / 2) * (1 - k12) ** ATTRACTION_POWER];
}
