import { loadAllGases } from '../../thermo/index.ts';
import type * as ProofDoor from './index.ts';

type Proof = typeof ProofDoor;

/** The proof with its data and every equation, fetched when it is wanted: the first plan needs none of it. */
export async function loadProof(): Promise<Proof> {
  await loadAllGases();
  return import('./index.ts');
}
