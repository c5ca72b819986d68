import type { Words } from './words.ts';

/** Sentences about contents, purity and the reach of the gas model. */

export const outsideRange = (where: string): Words => ({
  title: `Outside the range of the gas model ${where}`,
  detail: 'Temperature or pressure lies outside the range for which the authors of the equation state it; the stops are extrapolated.',
  remedy: 'Do not rely on these stops without an independent calculation.',
});

export const extendedRange = (where: string): Words => ({
  title: `In the extended range of the gas model ${where}`,
  detail: 'The authors of the equation state a larger uncertainty here than in its normal range.',
  remedy: '',
});

export const estimatedPairs = (pairs: string, matters: boolean, from: string): Words => ({
  title: `Gas model estimated for ${pairs}`,
  detail: matters
    ? `No measurements stand behind these pairs and both gases are above ${from}; the stops may be off by more than usual.`
    : `No measurements stand behind these pairs; one gas of each is below ${from}, so little depends on it.`,
  remedy: matters ? 'Weigh these additions if you can, and verify the finished gas by analysis.' : '',
});

export const cubicGas = (gases: string, matters: boolean, from: string): Words => ({
  title: `Cubic equation for ${gases}`,
  detail: matters
    ? `No reference equation of these gases is at hand, and one is above ${from}: the stops may be off by more than usual.`
    : `No reference equation of these gases is at hand; each is below ${from}, so little depends on it.`,
  remedy: matters ? 'Weigh these additions if you can, and verify the finished gas by analysis.' : '',
});

export const nitrogenDioxidePairs = (figure: string): Words => ({
  title: `Nitrogen dioxide: ${figure} paired as N₂O₄ in the full cylinder`,
  detail: 'Contents are counted in NO₂ units; every pair is one molecule less, which the stops take into account. At the pressure of use the pairs come apart again.',
  remedy: '',
});

export const unorderedGas = (gas: string, figure: string): Words => ({
  title: `Not ordered: ${gas} ${figure}`,
  detail: 'It comes from the residual gas or from an impurity of a parent.',
  remedy: 'Evacuate or purge the cylinder, or take a purer parent.',
});

export const purityNotStated = (name: string): Words => ({
  title: `Purity of ${name} not stated`,
  detail: 'Its composition is taken as exact; impurities in it are neither planned for nor judged.',
  remedy: 'Enter the purity table of this parent.',
});
