import type { Words } from './words.ts';

/** Sentences about what is in the cylinder before filling. */

export const contentsNotStated = (): Words => ({
  title: 'What is in the cylinder before filling is not stated',
  detail: 'The plan assumes a perfect vacuum. Left gas would change every stop, and may be flammable, oxidising or wet.',
  remedy: 'Evacuate the cylinder and enter the vacuum, or measure pressure and temperature of what is in it and enter its composition.',
});
