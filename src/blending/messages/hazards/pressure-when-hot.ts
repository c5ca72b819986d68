import type { Words } from './words.ts';

/** Sentences about test pressure, warm cylinders and pressure caps of single gases. */

export const testPressureNotStated = (at: string): Words => ({
  title: 'Test pressure not stated',
  detail: `The pressure that the finished gas develops at ${at} cannot be judged.`,
  remedy: 'Read the test pressure on the cylinder shoulder and enter it.',
});

export const aboveTestPressure = (figure: string, limit: string, at: string): Words => ({
  title: `Pressure at ${at} ${figure}, above the test pressure`,
  detail: `A cylinder that heats to ${at} must not develop more than its test pressure of ${limit}.`,
  remedy: 'Order a lower fill pressure or take a cylinder with a higher test pressure.',
});

export const withinTestPressure = (figure: string, limit: string, at: string): Words => ({
  title: `Pressure at ${at} ${figure}`,
  detail: `Not above the test pressure of ${limit}.`,
  remedy: '',
});

export const aboveTwoThirds = (figure: string, limit: string, at: string, share: string): Words => ({
  title: `Pressure at ${at} ${figure}, above ${share} of the test pressure`,
  detail: `The UN rule for compressed gas allows a settled pressure of up to ${share} of the test pressure, here ${limit}.`,
  remedy: 'Order a lower fill pressure, or check which filling rule applies to this cylinder.',
});

export const aboveFiveQuarters = (figure: string, limit: string, at: string, share: string): Words => ({
  title: `Pressure at ${at} ${figure}, above ${share} of the working pressure`,
  detail: `United States rules allow up to ${share} of the service pressure at ${at}, here ${limit}.`,
  remedy: 'Order a lower fill pressure if the cylinder is filled or shipped under these rules.',
});

export const aboveServicePressureToxic = (figure: string, limit: string, at: string, zone: string): Words => ({
  title: `Pressure at ${at} ${figure}, above the working pressure`,
  detail: `The mixture falls in hazard zone A or B (LC50 up to ${zone} µmol/mol), where United States rules allow no more than the service pressure at ${at}, here ${limit}.`,
  remedy: 'Order a lower fill pressure.',
});

export const developedPressures = (list: string): Words => ({
  title: 'Pressure of the closed cylinder at other temperatures',
  detail: `${list}.`,
  remedy: '',
});

export const carbonMonoxideCap = (at: string, figure: string, limit: string, dryLimit: string, partial: boolean): Words => ({
  title: `${partial ? 'Partial pressure of carbon monoxide' : 'Carbon monoxide'} at ${at} ${figure}, above ${limit}`,
  detail: `United States rules cap carbon monoxide at this pressure unless the gas is dry and free of sulfur; then the cap is ${dryLimit}. The rule is written for carbon monoxide itself and is applied here with care to a mixture.`,
  remedy: 'Lower the fill pressure, or document that the gas is dry and free of sulfur.',
});
