import { describe, expect, it } from 'vitest';
import { loadProof } from '../../src/blending/index.ts';
import { proofCommand } from '../../src/headless/proof-command.ts';

interface Report {
  readonly ok: boolean;
  readonly program: string;
  readonly dataDigest_SHA256: string;
  readonly counts: { readonly total: number; readonly within: number; readonly outside: number };
  readonly groups: readonly { readonly id: string; readonly counts: { readonly outside: number }; readonly cases: readonly Readonly<Record<string, unknown>>[] }[];
}

/** The real proof, cut down to a group that is quick, with one published value falsified or not. */
async function shortProof(falsify: boolean): ReturnType<typeof loadProof> {
  const proof = await loadProof();
  const groups = proof.proofGroups().filter(({ id }) => id === 'classification' || id === 'gerg-point');
  const [first, ...rest] = groups;
  const [lie, ...honest] = first!.cases;
  const cases = falsify ? [{ ...lie!, published: lie!.published * 1.01 }, ...honest] : first!.cases;
  return { ...proof, proofGroups: () => [{ ...first!, cases }, ...rest] };
}

describe('npm run proof', () => {
  it('reports every case within, with program and digest, and exits with 0', async () => {
    const { output, exitCode } = await proofCommand('Fillwright 0', () => shortProof(false));
    const report = JSON.parse(output) as Report;
    expect(exitCode).toBe(0);
    expect(report).toMatchObject({ ok: true, program: 'Fillwright 0', counts: { outside: 0 } });
    expect(report.dataDigest_SHA256).toMatch(/^[0-9a-f]{64}$/);
    expect(report.counts.total).toBe(report.groups.reduce((sum, { cases }) => sum + cases.length, 0));
    expect(report.groups[0]!.cases[0]).toMatchObject({ published: 20.5427445016, unit: 'g/mol', within: true, trust: 'published' });
  });

  it('reports a falsified value outside and exits with 1', async () => {
    const { output, exitCode } = await proofCommand('Fillwright 0', () => shortProof(true));
    const report = JSON.parse(output) as Report;
    expect(exitCode).toBe(1);
    expect(report).toMatchObject({ ok: false, counts: { outside: 1 } });
    const outside = report.groups.flatMap(({ cases }) => cases).filter(({ within }) => within !== true);
    expect(outside).toHaveLength(1);
    expect(outside[0]!.difference).toBeCloseTo(-0.0099, 3);
  });
});
