import { proofSize, runProof } from '../../src/blending/proof/run.ts';
import type { ProofGroup } from '../../src/blending/index.ts';
import { ok } from '../../src/units/index.ts';
import type { ProofParts } from '../../src/worker/drive.ts';

/** A proof of so many made-up cases, all within. */
export function shortProof(cases: number): ProofParts {
  const group: ProofGroup = {
    id: 'made', title: 'Made', why: 'constructed',
    cases: Array.from({ length: cases }, (_, index) => ({
      id: String(index), group: 'made', title: 'a made case', source: 'constructed', trust: 'constructed', published: 1, unit: '',
      tolerance: { kind: 'relative', value: 0.1 }, remark: '', compute: () => ok(1),
    })),
  };
  return { proofGroups: () => [group], proofSize, runProof, dataDigest: () => Promise.resolve(`digest of ${cases}`) };
}
