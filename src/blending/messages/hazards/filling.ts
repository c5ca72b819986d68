import { becauseOf } from './words.ts';
import type { Words } from './words.ts';

/** Sentences about caps of single gases and about how much a cylinder may hold. */

export const nitricOxideCap = (figure: string, limit: string, at: string, partial: boolean, rules: string): Words => ({
  title: `${partial ? 'Partial pressure of nitric oxide' : 'Nitric oxide'} at ${at} ${figure}, above ${limit}`,
  detail: `${rules} rules cap nitric oxide at this pressure; United States rules also ask for a stainless steel valve and no relief device. The rule is written for nitric oxide itself and is applied here with care to a mixture.`,
  remedy: 'Lower the fill pressure or the content of nitric oxide.',
});

export const capNotComputed = (at: string, code: string): Words => ({
  title: `Cap of nitric oxide at ${at} not computed`,
  detail: `${becauseOf(code)} The cap cannot be judged.`,
  remedy: 'Lower the fill pressure until the pressure can be computed; do not rely on this limit being kept.',
});

export const densityAbove = (gas: string, figure: string, limit: string, from: number): Words => ({
  title: `Filling density of ${gas} ${figure}, above ${limit}`,
  detail: `United States rules allow this mass, relative to the water that fills the cylinder, from a service pressure of ${from} psi gauge on. More gas can fill a warm cylinder with liquid and burst it.`,
  remedy: 'Fill less, by mass, and check the mass after disconnecting.',
});

export const densityBelow = (gas: string, figure: string, limit: string, from: number, stated: boolean): Words => ({
  title: `Filling density of ${gas} ${figure}`,
  detail: `Not above ${limit}, which United States rules allow from a service pressure of ${from} psi gauge on.${stated ? '' : ' The service pressure of the cylinder is not stated; the strictest row is used, and it may not be authorised at all.'}`,
  remedy: stated ? '' : 'Enter the service pressure of the cylinder.',
});

export const densityCylinder = (gas: string, figure: string, least: string): Words => ({
  title: `Cylinder not marked high enough for ${gas}`,
  detail: `The table of United States rules begins at a service pressure of ${least} for this gas; filling density here ${figure}.`,
  remedy: 'Take a cylinder with a higher service pressure, or find the rule that covers this one.',
});

export const fromTable = (gas: string, from: number): string => `for ${gas} from a test pressure of ${from} bar gauge on, from memory`;
export const fromFormula = (test: string, molarMass: string): string =>
  `from the formula for an unknown density: test pressure ${test} bar gauge, mean molar mass ${molarMass} g/mol, 65 °C`;

export const ratioAbove = (figure: string, limit: string, basis: string): Words => ({
  title: `Filling ratio ${figure}, above ${limit}`,
  detail: `UN limit ${basis}. The gas liquefies under pressure or comes near it.`,
  remedy: 'Fill less, or take a cylinder with a higher test pressure; check the figure in the packing instruction.',
});

export const ratioBelow = (figure: string, limit: string, basis: string): Words => ({
  title: `Filling ratio ${figure}`,
  detail: `Not above the UN limit of ${limit}, ${basis}.`,
  remedy: '',
});

export const ratioNotComputed = (): Words => ({
  title: 'Filling ratio cannot be judged',
  detail: 'The gas liquefies under pressure or comes near it, and the test pressure of the cylinder is not stated.',
  remedy: 'Read the test pressure on the cylinder shoulder and enter it.',
});

export const noOverfill = (why: string): Words => ({
  title: 'The ten percent above the mark do not apply',
  detail: `United States rules let some steel cylinders with a plus after their test date be filled 10 % above the mark, but never with flammable, poisonous or liquefied gas; this mixture is ${why}.`,
  remedy: '',
});
