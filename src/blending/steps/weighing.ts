import { kilogram, kilogramPerCubicMetre } from '../../units/index.ts';
import type { CubicMetre, Kelvin, Kilogram, KilogramPerCubicMetre, Pascal } from '../../units/index.ts';

/** Density of the weights a balance is adjusted with, kg/m³ (OIML R 111, conventional mass). */
export const WEIGHT_DENSITY = kilogramPerCubicMetre(8000);

/**
 * Density of moist air, kg/m³, from temperature, absolute pressure and relative
 * humidity (0…1): ρ = (0.34848 p − 0.009 h e^(0.061 t)) / (273.15 + t) with p in
 * hPa, h in %, t in °C. Source: OIML R 111-1 simplified formula, from memory;
 * good to about 2e-4 between 900 and 1100 hPa, 10 and 30 °C.
 */
export function airDensity(temperature: Kelvin, pressure: Pascal, relativeHumidity: number): KilogramPerCubicMetre {
  const celsius = temperature - 273.15;
  const humid = 0.009 * (relativeHumidity * 100) * Math.exp(0.061 * celsius);
  return kilogramPerCubicMetre((0.34848 * (pressure / 100) - humid) / temperature);
}

/**
 * Balance reading of a body of a true mass and an outside volume in air:
 * W = (m − ρₐV)/(1 − ρₐ/8000). Source: conventional-mass relation, OIML R 111.
 */
export function balanceReading(mass: Kilogram, outsideVolume: CubicMetre, air: KilogramPerCubicMetre): Kilogram {
  return kilogram((mass - air * outsideVolume) / (1 - air / WEIGHT_DENSITY));
}

/** True mass behind a balance reading: m = W (1 − ρₐ/8000) + ρₐV. */
export function weighedMass(reading: Kilogram, outsideVolume: CubicMetre, air: KilogramPerCubicMetre): Kilogram {
  return kilogram(reading * (1 - air / WEIGHT_DENSITY) + air * outsideVolume);
}
