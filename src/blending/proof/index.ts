/** The proof: published values, the program's way to each, and how they compare. Fetched through `load.ts`. */
export { dataDigest } from './digest.ts';
export { proofGroups } from './groups.ts';
export { proofCounts, proofSize, runProof } from './run.ts';
export type * from './case.ts';
