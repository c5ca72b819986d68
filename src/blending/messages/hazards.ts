/** Every sentence of the Checks list, by reason. The figures come in as they are shown. */
export * as pressureWords from './hazards/pressure.ts';
export * as oxygenWords from './hazards/oxygen.ts';
export * as classWords from './hazards/classification.ts';
export * as togetherWords from './hazards/fuel-and-oxidiser.ts';
export * as condensationWords from './hazards/condensation.ts';
export * as releaseWords from './hazards/release.ts';
export * as materialWords from './hazards/material.ts';
export * as instrumentWords from './hazards/instruments.ts';
export * as compositionWords from './hazards/composition.ts';
