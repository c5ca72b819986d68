import type { HazardRule } from './rule.ts';
import { acetylenePressure } from './rules/acetylene-pressure.ts';
import { batchSupply } from './rules/batch-supply.ts';
import { balanceTooCoarse } from './rules/balance.ts';
import { carbonMonoxidePressure } from './rules/carbon-monoxide-pressure.ts';
import { condensationAtStep } from './rules/condensation-step.ts';
import { condensationInStorage } from './rules/condensation-storage.ts';
import { conditioningLine } from './rules/conditioning-line.ts';
import { conditioningFuelAndOxidiser } from './rules/conditioning-meeting.ts';
import { conditioningIncompatiblePair } from './rules/conditioning-pair.ts';
import { conditioningPressure } from './rules/conditioning-pressure.ts';
import { conditioningLevel, conditioningSupply } from './rules/conditioning-purge.ts';
import { contentsNotStated } from './rules/contents.ts';
import { cylinderMaterial } from './rules/cylinder-material.ts';
import { fillingDensity, fillingRatio } from './rules/filling.ts';
import { flammableGas } from './rules/flammable-gas.ts';
import { fuelMeetsOxidiser } from './rules/fuel-meets-oxidiser.ts';
import { fuelWithOxidiser } from './rules/fuel-with-oxidiser.ts';
import { cubicGas, estimatedPairs, modelRange, nitrogenDioxidePairs } from './rules/gas-model.ts';
import { gaugeOverRange, gaugeTooCoarse } from './rules/gauge.ts';
import { hazardZone } from './rules/hazard-zone.ts';
import { incompatiblePair } from './rules/incompatible-pair.ts';
import { laboratoryValues } from './rules/laboratory-values.ts';
import { material, valveAndFittings } from './rules/metal.ts';
import { nitricOxidePressure } from './rules/nitric-oxide-pressure.ts';
import { orderNotSearched } from './rules/order-not-searched.ts';
import { overfillNotAllowed } from './rules/overfill.ts';
import { oxidisingGas } from './rules/oxidising-gas.ts';
import { oxygenCompressionHeat } from './rules/oxygen-compression.ts';
import { oxygenEnriched } from './rules/oxygen-enriched.ts';
import { oxygenLine } from './rules/oxygen-line.ts';
import { developedPressures, pressureAt55 } from './rules/pressure-when-hot.ts';
import { purityNotStated, unorderedGas } from './rules/purity.ts';
import { roomToxic } from './rules/room-toxic.ts';
import { roomFlammableRule, roomOxygenRule } from './rules/room.ts';
import { stopAboveWorkingPressure } from './rules/stop-pressure.ts';
import { supplyPressure } from './rules/supply.ts';
import { testPressure, twoThirdsOfTestPressure } from './rules/test-pressure.ts';
import { toxicGas } from './rules/toxic-gas.ts';
import { vacuumUnlikely } from './rules/vacuum.ts';
import { workingPressure } from './rules/working-pressure.ts';

/** Every rule, the gravest subjects first; findings of equal weight keep this order. */
export const hazardRules: readonly HazardRule[] = [
  fuelWithOxidiser,
  fuelMeetsOxidiser,
  conditioningFuelAndOxidiser,
  incompatiblePair,
  conditioningIncompatiblePair,
  acetylenePressure,
  workingPressure,
  testPressure,
  stopAboveWorkingPressure,
  conditioningPressure,
  twoThirdsOfTestPressure,
  pressureAt55,
  fillingDensity,
  fillingRatio,
  carbonMonoxidePressure,
  nitricOxidePressure,
  overfillNotAllowed,
  contentsNotStated,
  vacuumUnlikely,
  conditioningLevel,
  oxygenEnriched,
  oxygenLine,
  conditioningLine,
  oxygenCompressionHeat,
  toxicGas,
  hazardZone,
  flammableGas,
  oxidisingGas,
  condensationInStorage,
  condensationAtStep,
  roomOxygenRule,
  roomFlammableRule,
  roomToxic,
  cylinderMaterial,
  material,
  valveAndFittings,
  orderNotSearched,
  supplyPressure,
  conditioningSupply,
  batchSupply,
  gaugeOverRange,
  gaugeTooCoarse,
  balanceTooCoarse,
  unorderedGas,
  purityNotStated,
  modelRange,
  estimatedPairs,
  cubicGas,
  nitrogenDioxidePairs,
  developedPressures,
  laboratoryValues,
];
