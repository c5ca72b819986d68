/**
 * Printed on every fill sheet. Common practice of high-pressure work; they defer
 * to local codes, which may ask for more.
 */
export const CAUTIONS: readonly string[] = [
  'Local codes, the cylinder’s approval and licensed practice decide; this sheet is not an authorisation.',
  'Look over cylinder and valve before filling: test date, damage, thread, marked pressures.',
  'Open every valve slowly, stand aside of valve and gauge, stop short of the stop and top up after settling.',
  'Read pressure and gas temperature together, after both have settled; use the column of the temperature you read.',
  'Oxygen and oxygen-enriched gas: oxygen-clean fittings only, no oil or grease, never open quickly.',
  'Purge the line with the next parent before it is opened to the cylinder; vent to the vent line.',
];
