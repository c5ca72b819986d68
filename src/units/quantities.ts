/**
 * Branded SI quantities. A brand stops a pascal being passed for a kelvin; it
 * does not check arithmetic, so a function that computes a quantity wraps its
 * result through the constructor of the unit it claims, and the law tests
 * guard the dimensions.
 */
declare const unitOf: unique symbol;

/** A plain number that carries the name of its SI unit in its type. */
export type Quantity<Unit extends string> = number & { readonly [unitOf]: Unit };

/** Makes the constructor of one quantity; the value passes through untouched. */
function quantity<Unit extends string>(): (value: number) => Quantity<Unit> {
  return (value) => value as Quantity<Unit>;
}

/** Thermodynamic temperature, K. */
export type Kelvin = Quantity<'K'>;
/** Absolute pressure, Pa. Gauge readings have their own type in `pressure.ts`. */
export type Pascal = Quantity<'Pa'>;
/** Volume, m³. */
export type CubicMetre = Quantity<'m3'>;
/** Mass, kg. */
export type Kilogram = Quantity<'kg'>;
/** Amount of substance, mol. */
export type Mole = Quantity<'mol'>;
/** Amount density, mol/m³. */
export type MolePerCubicMetre = Quantity<'mol/m3'>;
/** Mass density, kg/m³. */
export type KilogramPerCubicMetre = Quantity<'kg/m3'>;
/** Molar mass, kg/mol. */
export type KilogramPerMole = Quantity<'kg/mol'>;
/** Molar energy, J/mol. */
export type JoulePerMole = Quantity<'J/mol'>;
/** Molar entropy or heat capacity, J/(mol K). */
export type JoulePerMoleKelvin = Quantity<'J/(mol K)'>;
/** Speed, m/s. */
export type MetrePerSecond = Quantity<'m/s'>;
/** Amount fraction, mol/mol. */
export type Fraction = Quantity<'mol/mol'>;

export const kelvin = quantity<'K'>();
export const pascal = quantity<'Pa'>();
export const cubicMetre = quantity<'m3'>();
export const kilogram = quantity<'kg'>();
export const mole = quantity<'mol'>();
export const molePerCubicMetre = quantity<'mol/m3'>();
export const kilogramPerCubicMetre = quantity<'kg/m3'>();
export const kilogramPerMole = quantity<'kg/mol'>();
export const joulePerMole = quantity<'J/mol'>();
export const joulePerMoleKelvin = quantity<'J/(mol K)'>();
export const metrePerSecond = quantity<'m/s'>();
export const fraction = quantity<'mol/mol'>();
