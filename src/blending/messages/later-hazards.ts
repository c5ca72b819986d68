/** Sentences of the rules that are loaded later; apart from the others so that the first screen does not carry them. */
export * as reactionWords from './hazards/reactions.ts';
export * as metalWords from './hazards/metals.ts';
export * as materialWords from './hazards/material.ts';
export * as compositionWords from './hazards/composition.ts';
export * as storageWords from './hazards/storage.ts';
export * as hotWords from './hazards/pressure-when-hot.ts';
export * as conditioningWords from './hazards/conditioning.ts';
export * as batchWords from './hazards/batch.ts';
export * as toxicityWords from './hazards/toxicity.ts';
export * as releaseWords from './hazards/release.ts';
export * as oxygenWords from './hazards/oxygen.ts';
export * as oxygenLineWords from './hazards/oxygen-line.ts';
export * as fillingWords from './hazards/filling.ts';
export * as classWords from './hazards/classification.ts';
export * as suggestedClassWords from './hazards/suggested-class.ts';
