import type { Words } from './words.ts';

/** Sentences about several cylinders from the same parents. */

export const runsOut = (name: string, cylinder: number, step: number, stop: string): Words => ({
  title: `${name} runs out at cylinder ${String(cylinder)}`,
  detail: `There it falls below ${stop}, which ${step === 0 ? 'the purge' : `step ${String(step)}`} needs.`,
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
