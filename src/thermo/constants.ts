/** Molar gas constant, J/(mol K): exact since 2019 (CODATA 2018 and later). */
export const GAS_CONSTANT = 8.314462618;

/** The gas constant GERG-2008 was published with, J/(mol K); Kunz and Wagner 2012. */
export const GERG2008_GAS_CONSTANT = 8.314472;

/** Temperature at which h = s = 0 for each pure ideal gas, K (Kunz and Wagner 2012). */
export const REFERENCE_TEMPERATURE = 298.15;

/** Pressure at which s = 0 for each pure ideal gas, Pa (Kunz and Wagner 2012). */
export const REFERENCE_PRESSURE = 101_325;
