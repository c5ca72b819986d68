import { becauseOf } from './words.ts';
import type { Words } from './words.ts';

/** Sentences of the pressure rules. Pressures arrive with unit and reference. */

export const workingPressureNotStated = (): Words => ({
  title: 'Working pressure not stated',
  detail: 'Neither the finished pressure, nor its rise to 55 °C, nor any stop on the way can be judged.',
  remedy: 'Read the working or service pressure on the cylinder shoulder and enter it with its reference temperature.',
});

export const aboveWorkingPressure = (figure: string, limit: string, at: string): Words => ({
  title: `Pressure at ${at} ${figure}, above the working pressure`,
  detail: `The cylinder is marked ${limit} at ${at}. The finished gas would stand above that.`,
  remedy: 'Order a lower fill pressure or take a cylinder with a higher working pressure.',
});

export const withinWorkingPressure = (figure: string, limit: string, at: string): Words => ({
  title: `Pressure at ${at} ${figure}`,
  detail: `Not above the marked working pressure of ${limit}.`,
  remedy: '',
});

export const pressureNotComputed = (what: string, at: string, code: string): Words => ({
  title: `${what} at ${at} not computed`,
  detail: `${becauseOf(code)} The limit cannot be judged.`,
  remedy: 'Lower the fill pressure or change the mixture until the pressure can be computed; do not rely on this limit being kept.',
});

export const stopAboveWorkingPressure = (step: number, figure: string, limit: string, at: string): Words => ({
  title: `Stop of step ${step} ${figure}, above the working pressure`,
  detail: `The cylinder is marked ${limit} at ${at}; brought to that temperature the gas of this step would still stand above it.`,
  remedy: 'Lower the fill pressure or change the order of addition.',
});

export const stopAboveWorkingPressureWarm = (step: number, figure: string, limit: string, at: string): Words => ({
  title: `Stop of step ${step} reads ${figure}, above the marked pressure`,
  detail: `The cylinder is marked ${limit} at ${at}. The gas is warmer at this stop; brought to ${at} it would not stand above the mark.`,
  remedy: 'Check the gas temperature before going to this stop; a colder gas at the same reading is overfilled.',
});

export const stopNotJudged = (step: number, figure: string, code: string): Words => ({
  title: `Stop of step ${step} ${figure} cannot be judged against the working pressure`,
  detail: `It reads above the mark, and its pressure at the marked temperature was not computed. ${becauseOf(code)}`,
  remedy: 'Lower the fill pressure or let the gas cool before reading this stop.',
});
