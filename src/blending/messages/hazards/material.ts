import type { Words } from './words.ts';

/** Sentences about gases and the metal of the cylinder. */

const unknown = (stated: boolean): string => (stated ? '' : ' The material is not stated; judged as steel.');

export const carbonMonoxideInSteel = (figure: string, stated: boolean): Words => ({
  title: `Carbon monoxide in steel: ${figure}`,
  detail: `Moist carbon monoxide, above all with carbon dioxide, cracks steel under stress; iron and nickel carbonyls form at high pressure.${unknown(stated)}`,
  remedy: 'Use dry gas and a dry cylinder; prefer aluminium.',
});

export const hydrogenSulfideInSteel = (figure: string, stated: boolean): Words => ({
  title: `Hydrogen sulfide in steel: ${figure}`,
  detail: `Hydrogen sulfide cracks strong or wet steel, and traces are lost to its surface.${unknown(stated)}`,
  remedy: 'Use dry gas and treated aluminium, or steel whose strength is limited for this service.',
});

export const hydrogenInSteel = (partial: string, from: string, stated: boolean): Words => ({
  title: `Hydrogen in steel, partial pressure ${partial}`,
  detail: `Above a partial pressure of about ${from}, quenched and tempered steel must be limited in strength (about 950 MPa); such cylinders carry the mark H.${unknown(stated)}`,
  remedy: 'Check the mark on the shoulder, or take aluminium.',
});

export const littleHydrogenInSteel = (partial: string, stated: boolean): Words => ({
  title: `Hydrogen in steel, partial pressure ${partial}`,
  detail: `Not above the partial pressure from which the strength of the steel must be limited.${unknown(stated)}`,
  remedy: '',
});
