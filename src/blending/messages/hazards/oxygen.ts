import type { Words } from './words.ts';

/** Sentences of the oxygen rules. */

const cleanliness =
  'Use only cylinder, valve, line, seals and gauge cleaned and rated for oxygen: no oil, grease or thread compound. Open valves slowly, from the side away from people.';

export const enrichedStep = (first: number, last: number, figure: string): Words => ({
  title: first === last ? `Oxygen-enriched after step ${first}: ${figure}` : `Oxygen-enriched from step ${first} to ${last}: up to ${figure}`,
  detail: 'From here on the gas in the cylinder feeds a fire more than air does; many metals and all oils burn in it under pressure.',
  remedy: cleanliness,
});

export const enrichedStart = (figure: string): Words => ({
  title: `What is left in the cylinder is oxygen-enriched: ${figure}`,
  detail: 'The residual gas feeds a fire more than air does.',
  remedy: cleanliness,
});

export const enrichedFinished = (figure: string, worst: string): Words => ({
  title: `Finished gas oxygen-enriched: ${figure}`,
  detail: `Highest within the tolerance: ${worst}. Counted as oxygen content or as oxidising power, whichever is higher.`,
  remedy: `${cleanliness} Label the cylinder as oxidising where its class asks for it.`,
});

export const enrichedWithinTolerance = (figure: string, worst: string): Words => ({
  title: `Finished gas may be oxygen-enriched: up to ${worst}`,
  detail: `As planned it is ${figure}; the high end of the tolerance lies above the limit.`,
  remedy: cleanliness,
});

export const enrichedParent = (name: string, figure: string): Words => ({
  title: `Parent ${name} is oxygen-enriched: ${figure}`,
  detail: 'Its line, regulator and filling valve are in oxygen service.',
  remedy: cleanliness,
});

export const enrichmentNotComputed = (gas: string): Words => ({
  title: 'Oxygen enrichment not computed',
  detail: `${gas} is not in the tables of this check.`,
  remedy: 'Treat the mixture as oxidising until someone with the data has judged it.',
});

export const compressionHeat = (name: string, ratio: string, temperature: string, from: string): Words => ({
  title: `Opening ${name} quickly could heat the line to ${temperature}`,
  detail: `Adiabatic compression of ideal oxygen by a ratio of ${ratio} from ${from} and atmospheric pressure. Most seals and all oils ignite far below such temperatures; a line under vacuum makes the ratio larger still.`,
  remedy: 'Open the parent valve slowly onto a closed filling valve, equalise, then throttle. No plastic or dirty parts at dead ends.',
});

export const compressionHeatLow = (name: string, ratio: string, temperature: string, from: string, slow: string): Words => ({
  title: `Opening ${name} quickly could heat the line to ${temperature}`,
  detail: `Adiabatic compression of ideal oxygen by a ratio of ${ratio} from ${from} and atmospheric pressure; its supply pressure is not above ${slow}, from where slow-opening valves are asked for.`,
  remedy: '',
});

export const compressionHeatNotComputed = (name: string): Words => ({
  title: `Heat of opening ${name} cannot be computed`,
  detail: 'Its supply pressure is not stated. From 200 bar, oxygen compressed adiabatically can pass 1000 °C.',
  remedy: 'Enter the supply pressure of this parent; open its valve slowly in any case.',
});
