import type { Words } from './words.ts';

/** Sentences about how far the parents last. */

const need = (step: number): string => (step === 0 ? 'the purge' : `step ${String(step)}`);

export const cannotFinish = (name: string, cylinders: number, step: number, stop: string): Words => ({
  title: cylinders === 1 ? `${name} does not hold enough for one cylinder` : `${name} does not hold enough for ${String(cylinders)} cylinders`,
  detail: `As it is drawn it falls below ${stop}, which ${need(step)} needs: flow would stop before it, and the cylinder could push back into it.`,
  remedy: 'Take a fuller or larger parent, add it earlier in the order, fill fewer at a time, or use a booster made for this gas.',
});

export const runsOut = (name: string, cylinder: number, step: number, stop: string): Words => ({
  title: `${name} runs out at cylinder ${String(cylinder)}`,
  detail: `There it falls below ${stop}, which ${need(step)} needs.`,
  remedy: 'Have another cylinder of it at hand, fill fewer, or use a booster.',
});

export const onlyBoosted = (name: string, cylinder: number): Words => ({
  title: `${name} needs the booster from cylinder ${String(cylinder)} on`,
  detail: 'Without it the batch would end there.',
  remedy: '',
});

export const notComputed = (name: string, cylinders: number): Words => ({
  title: `Whether ${name} lasts for ${String(cylinders)} cylinders is not computed`,
  detail: 'How much it holds cannot be said from what is stated of it.',
  remedy: 'Enter its water capacity and pressure, or for a liquefied gas the mass left in it.',
});
