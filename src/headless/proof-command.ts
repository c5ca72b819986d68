import { loadProof } from '../blending/index.ts';
import type { ProofResult } from '../blending/index.ts';
import type { CommandAnswer } from './run.ts';

type Proof = Pick<Awaited<ReturnType<typeof loadProof>>, 'proofGroups' | 'proofCounts' | 'runProof' | 'dataDigest'>;

/** The whole proof as one JSON report; exit 1 when any case is outside its tolerance. */
export async function proofCommand(program: string, load: () => Promise<Proof> = loadProof): Promise<CommandAnswer> {
  const { proofGroups, proofCounts, runProof, dataDigest } = await load();
  const groups = proofGroups();
  const results = [...runProof(groups)];
  const counts = proofCounts(results);
  const report = {
    ok: counts.outside === 0,
    program,
    dataDigest_SHA256: await dataDigest(groups),
    counts,
    groups: groups.map(({ id, title, why }) => {
      const own = results.filter(({ group }) => group === id);
      return { id, title, why, counts: proofCounts(own), cases: own.map(caseJson) };
    }),
  };
  return { output: JSON.stringify(report, null, 1), exitCode: report.ok ? 0 : 1 };
}

function caseJson({ group: _group, reason, remark, ...rest }: ProofResult): object {
  return { ...rest, ...(reason === '' ? {} : { reason }), ...(remark === '' ? {} : { remark }) };
}
