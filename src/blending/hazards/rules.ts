import type { HazardRule } from './rule.ts';
import { condensationAtStep } from './rules/condensation-step.ts';
import { contentsNotStated } from './rules/contents.ts';
import { fuelMeetsOxidiser } from './rules/fuel-meets-oxidiser.ts';
import { fuelWithOxidiser } from './rules/fuel-with-oxidiser.ts';
import { gaugeOverRange, gaugeTooCoarse } from './rules/gauge.ts';
import { orderNotSearched } from './rules/order-not-searched.ts';
import { stopAboveWorkingPressure } from './rules/stop-pressure.ts';
import { supplyPressure } from './rules/supply.ts';
import { vacuumUnlikely } from './rules/vacuum.ts';
import { workingPressure } from './rules/working-pressure.ts';

/**
 * The rules that judge the very first plan: what may happen while the cylinder
 * is filled. The others come a moment later, see `all-rules.ts`.
 */
export const firstRules: readonly HazardRule[] = [
  fuelWithOxidiser,
  fuelMeetsOxidiser,
  workingPressure,
  stopAboveWorkingPressure,
  contentsNotStated,
  vacuumUnlikely,
  condensationAtStep,
  orderNotSearched,
  supplyPressure,
  gaugeOverRange,
  gaugeTooCoarse,
];
