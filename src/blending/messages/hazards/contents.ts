import type { Words } from './words.ts';

/** Sentences about what is in the cylinder before filling. */

export const contentsNotStated = (): Words => ({
  title: 'What is in the cylinder before filling is not stated',
  detail: 'The plan assumes a perfect vacuum. Left gas would change every stop, and may be flammable, oxidising or wet.',
  remedy: 'Evacuate the cylinder and enter the vacuum, or measure pressure and temperature of what is in it and enter its composition.',
});

export const noVacuum = (figure: string): Words => ({
  title: `The cylinder is called evacuated at ${figure}`,
  detail: 'That is no vacuum. A reading of a vacuum gauge is absolute; typed as gauge it stands for the whole atmosphere on top, and every stop is wrong by it.',
  remedy: 'Say “absolute” for the vacuum, or say that the cylinder holds a residual, with its composition.',
});

export const poorVacuum = (figure: string): Words => ({
  title: `Poor vacuum: ${figure}`,
  detail: 'What is left is counted as the balance gas. If it is air or an old gas, the blend is another one.',
  remedy: 'Pump further, or say that the cylinder holds a residual, with its composition.',
});
