/** Door of the suggested class; loaded with the later rules. */
export { suggestClassification } from './classification.ts';
export type { Classification, ClassLine, SuggestedClass, TransportClass } from './classification.ts';
