import type { Words } from './words.ts';

/** Sentences about the filling line in oxygen service. */

export const line = (first: number, last: number, parent: string, figure: string): Words => ({
  title: first === last ? `The filling line carries enriched gas at step ${first}: ${figure}` : `The filling line is in oxygen service from step ${first} on: ${figure}`,
  detail: `${parent} comes through it. Line, hose, gauge and filling valve must be clean and rated for oxygen up to here, whatever is filled later.`,
  remedy: '',
});

export const lineWithFuel = (first: number, parent: string, figure: string, fuels: string): Words => ({
  title: `The filling line carries fuel and, from step ${first} on, enriched gas: ${figure}`,
  detail: `${parent} is enriched; fuel comes through the same line from ${fuels}. What is left in a hose or a dead end meets under pressure.`,
  remedy: 'Use separate lines, or purge and vent the line with inert gas between the two; keep line, hose and gauge clean and rated for oxygen.',
});
