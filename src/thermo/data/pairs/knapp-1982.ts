/**
 * k₁₂ of the Peng–Robinson equation for pairs with a gas that has no other
 * equation.
 *
 * Source: H. Knapp, R. Döring, L. Oellrich, U. Plöcker, J. M. Prausnitz,
 * Vapor-Liquid Equilibria for Mixtures of Low Boiling Substances, DECHEMA
 * Chemistry Data Series VI (1982), pages 512, 697 and 702. Page 576 has −0.43 for
 * acetylene and propylene: not plausible beside the others, and left out. The
 * rows of gases that all have equations of their own are not needed here.
 */
import type { GasId } from '../gases.ts';

export const knapp1982: readonly (readonly [first: GasId, second: GasId, k12: number])[] = [
  ['ethylene', 'acetylene', 0.0652],
  ['1-butene', '1,3-butadiene', 0.0022],
  ['1,3-butadiene', 'n-butane', 0.0141],
];
