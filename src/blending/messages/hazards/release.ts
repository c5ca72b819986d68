import type { Words } from './words.ts';

/** Sentences about the cylinder emptying into the room. */

export const roomNotStated = (): Words => ({
  title: 'Room volume not stated',
  detail: 'What the air becomes when the cylinder empties into the room cannot be judged.',
  remedy: 'Enter the volume of the room where the cylinder is filled or used.',
});

export const oxygenDeficient = (figure: string, volume: string, belowEighteen: boolean): Words => ({
  title: `Room air would fall to ${figure} oxygen`,
  detail: `If the whole cylinder (${volume} of gas) emptied into the room without ventilation and mixed fully. ${belowEighteen ? 'People lose consciousness without warning as oxygen falls further; near the cylinder it is lower still.' : 'Near the cylinder it is lower still.'}`,
  remedy: belowEighteen
    ? 'Fill and use only with forced ventilation and an oxygen alarm, never alone.'
    : 'Ventilate, and use an oxygen alarm.',
});

export const oxygenRich = (figure: string, volume: string): Words => ({
  title: `Room air would rise to ${figure} oxygen`,
  detail: `If the whole cylinder (${volume} of gas) emptied into the room without ventilation and mixed fully. Clothing and hair burn fiercely in enriched air.`,
  remedy: 'Ventilate, use an oxygen alarm, keep ignition sources away.',
});

export const oxygenInRoom = (figure: string, volume: string): Words => ({
  title: `Room air would hold ${figure} oxygen`,
  detail: `If the whole cylinder (${volume} of gas) emptied into the room without ventilation and mixed fully; near the cylinder it is lower.`,
  remedy: '',
});

export const flammableRoom = (figure: string): Words => ({
  title: `Room air would reach ${figure} of the lower flammable limit`,
  detail: 'If the whole cylinder emptied into the room without ventilation and mixed fully; near the leak it is far richer.',
  remedy: 'Ventilate, use a flammable gas detector, keep ignition sources away.',
});
