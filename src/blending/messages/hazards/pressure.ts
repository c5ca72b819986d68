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

export const testPressureNotStated = (): Words => ({
  title: 'Test pressure not stated',
  detail: 'The pressure that the finished gas develops at 65 °C cannot be judged.',
  remedy: 'Read the test pressure on the cylinder shoulder and enter it.',
});

export const aboveTestPressure = (figure: string, limit: string): Words => ({
  title: `Pressure at 65 °C ${figure}, above the test pressure`,
  detail: `A cylinder that heats to 65 °C must not develop more than its test pressure of ${limit}.`,
  remedy: 'Order a lower fill pressure or take a cylinder with a higher test pressure.',
});

export const withinTestPressure = (figure: string, limit: string): Words => ({
  title: `Pressure at 65 °C ${figure}`,
  detail: `Not above the test pressure of ${limit}.`,
  remedy: '',
});

export const aboveTwoThirds = (figure: string, limit: string): Words => ({
  title: `Pressure at 15 °C ${figure}, above two thirds of the test pressure`,
  detail: `The UN rule for compressed gas allows a settled pressure of up to two thirds of the test pressure, here ${limit}.`,
  remedy: 'Order a lower fill pressure, or check which filling rule applies to this cylinder.',
});

export const aboveFiveQuarters = (figure: string, limit: string): Words => ({
  title: `Pressure at 55 °C ${figure}, above 5/4 of the working pressure`,
  detail: `United States rules allow up to 5/4 of the service pressure at 55 °C, here ${limit}.`,
  remedy: 'Order a lower fill pressure if the cylinder is filled or shipped under these rules.',
});

export const aboveServicePressureToxic = (figure: string, limit: string): Words => ({
  title: `Pressure at 55 °C ${figure}, above the working pressure`,
  detail: `The mixture falls in hazard zone A or B (LC50 up to 1000 µmol/mol), where United States rules allow no more than the service pressure at 55 °C, here ${limit}.`,
  remedy: 'Order a lower fill pressure.',
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

export const developedPressures = (list: string): Words => ({
  title: 'Pressure of the closed cylinder at other temperatures',
  detail: `${list}.`,
  remedy: '',
});

export const carbonMonoxideCap = (figure: string, limit: string, dryLimit: string, partial: boolean): Words => ({
  title: `${partial ? 'Partial pressure of carbon monoxide' : 'Carbon monoxide'} at 21.1 °C ${figure}, above ${limit}`,
  detail: `United States rules cap carbon monoxide at this pressure unless the gas is dry and free of sulfur; then the cap is ${dryLimit}. The rule is written for carbon monoxide itself and is applied here with care to a mixture.`,
  remedy: 'Lower the fill pressure, or document that the gas is dry and free of sulfur.',
});
