/** Door of the worker layer (level 3): work that takes longer than a frame or two, on a thread of its own. */
export { calculator } from './calculator.ts';
export { proofRunner } from './client.ts';
export { inlineRunner } from './inline.ts';
