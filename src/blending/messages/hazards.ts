/** Sentences of the rules that judge the first plan, by subject. The figures come in as they are shown. */
export * as pressureWords from './hazards/pressure.ts';
export * as togetherWords from './hazards/fuel-and-oxidiser.ts';
export * as condensationWords from './hazards/condensation.ts';
export * as instrumentWords from './hazards/instruments.ts';
export * as contentsWords from './hazards/contents.ts';
export * as sequenceWords from './hazards/sequence.ts';
