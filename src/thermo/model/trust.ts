/**
 * How far to trust the model of a mixture.
 *
 * The constants are root mean squares of comparisons at bench states (273 to
 * 313 K, to 20 MPa, gas), repeated in tests/reference/model-trust.test.ts:
 *
 * - GERG-2008 against the long reference equations of its pure gases (155 states):
 *   0.04 % of density.
 * - Fitted GERG pairs put to the arithmetic-mean rule on purpose (3,669 states): the
 *   density moves by 0.16 · 2xᵢxⱼ ρvᵢⱼ, as an error 0.16 vᵢⱼ of the cross virial
 *   coefficient would move it; vᵢⱼ is the mean reducing volume. Water is worse.
 * - Gases with a reference equation put to Peng–Robinson on purpose, in nitrogen,
 *   argon, helium and methane (11,746 states): the density moves by 0.12 · xᵢ ρvᵢ.
 *
 * A pair fitted to phase boundaries counts as an estimated one here: nothing at
 * hand shows that it gives the density of a gas better.
 */
import type { GasId } from '../data/gases.ts';
import type { Composition, ModelTrust } from '../contract.ts';
import type { CompiledMixture, CompiledPair } from './compile.ts';

/** Relative standard uncertainty of density of a reference equation. */
export const EQUATION_UNCERTAINTY = 5e-4;
/** Of a cross virial coefficient not fitted to densities, in reducing volumes. */
export const PAIR_UNCERTAINTY = 0.16;
/** Of a cubic gas, in reducing volumes. */
export const CUBIC_UNCERTAINTY = 0.12;
/** A pair with a product of fractions below this moves no figure that is shown, nor does a cubic gas with such a fraction. */
const MATTERS = 1e-5;

/** The class of the mixture, without the density. */
export function modelClassOf(
  { gases, pairs }: CompiledMixture, ids: readonly GasId[], x: Composition,
): Omit<ModelTrust, 'relativeStandardUncertainty'> {
  const estimatedPairs = pairs
    .filter(({ first, second, origin }) => (origin === 'mean' || origin === 'unfitted') && x[first]! * x[second]! >= MATTERS)
    .map(({ first, second }) => [ids[first]!, ids[second]!] as const);
  const cubicGases = ids.filter((_, i) => gases[i]!.equation === 'Peng–Robinson' && x[i]! >= MATTERS);
  return { class: cubicGases.length > 0 ? 'cubic' : estimatedPairs.length > 0 ? 'estimated' : 'fitted', estimatedPairs, cubicGases };
}

/** Relative standard uncertainty of the density ρ, mol/m³; the parts are taken as independent. */
export function densityUncertainty({ gases, pairs }: CompiledMixture, density: number, x: Composition): number {
  let sum = EQUATION_UNCERTAINTY ** 2;
  for (const pair of pairs) {
    if (pair.origin !== 'fitted') sum += (PAIR_UNCERTAINTY * 2 * x[pair.first]! * x[pair.second]! * density * meanVolume(gases, pair)) ** 2;
  }
  for (const [i, gas] of gases.entries()) {
    if (gas.equation === 'Peng–Robinson') sum += (CUBIC_UNCERTAINTY * x[i]! * density * gas.reducingVolume) ** 2;
  }
  return Math.sqrt(sum);
}

function meanVolume(gases: CompiledMixture['gases'], { first, second }: CompiledPair): number {
  return (gases[first]!.reducingVolume + gases[second]!.reducingVolume) / 2;
}
