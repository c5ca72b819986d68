import type { Words } from './words.ts';

/** Sentences about toxic gas: its zone in transport, and the room. */

export const zone = (letter: string, planned: string, worst: string, grave: boolean, noRelief: boolean): Words => ({
  title: `Hazard zone ${letter}: LC50 ${planned} µmol/mol`,
  detail: `Lowest within the tolerance ${worst} µmol/mol.${grave ? ' In zones A and B United States rules ask that the pressure at 55 °C is not above the service pressure and that the cylinder is not liquid-full then; see the check at 55 °C.' : ''}${noRelief ? ' UN rules allow no pressure relief device and no more than 85 L for such a gas, and ask for a leak test after filling.' : ''}`,
  remedy: grave ? 'Take a cylinder and valve that are authorised for this zone, without relief device where the rule says so, and test for leaks after filling.' : '',
});

export const tooLarge = (figure: string, limit: string): Words => ({
  title: `Cylinder of ${figure} is too large for so toxic a gas`,
  detail: `UN rules allow no more than ${limit} of water capacity for a gas with an LC50 up to 200 µmol/mol.`,
  remedy: 'Take a smaller cylinder.',
});

const estimate = (released: string): string =>
  `If the whole cylinder (${released} of gas) emptied into the room without ventilation and mixed fully; near the leak it is far more.`;

export const roomNotStated = (gases: string): Words => ({
  title: 'Toxic gas in the room not computed',
  detail: `The room volume is not stated, and the cylinder holds ${gases}.`,
  remedy: 'Enter the volume of the room where the cylinder is filled or used; fill under extraction in any case.',
});

export const roomAbove = (gas: string, figure: string, limit: string, released: string): Words => ({
  title: `Room air would hold ${figure} ${gas}`,
  detail: `${estimate(released)} Level from which life or escape is in danger: ${limit}. Exposure limits at work are far lower.`,
  remedy: 'Fill and use only under extraction, with a detector for this gas and a way out; never alone.',
});

export const roomBelow = (list: string, released: string): Words => ({
  title: 'Toxic gas in the room if the cylinder empties into it',
  detail: `${list}. ${estimate(released)} Exposure limits at work are far lower.`,
  remedy: '',
});

export const roomUnknown = (list: string, released: string): Words => ({
  title: `Harmful gas in the room cannot be judged: ${list}`,
  detail: `${estimate(released)} This program has neither an IDLH nor an LC50 for it.`,
  remedy: 'Take its limits from its safety data sheet; fill under extraction.',
});
