import type { Finding, Override } from '../../../blending/index.ts';

/** The override that stands for a hold: given for this finding and for the very figure it shows now. */
export function standingOverride(finding: Finding, overrides: readonly Override[]): Override | null {
  return overrides.find((override) => override.finding === finding.id && override.figure === finding.figure) ?? null;
}

/** Holds that nobody has overridden. */
export function openHolds(findings: readonly Finding[], overrides: readonly Override[]): readonly Finding[] {
  return findings.filter((finding) => finding.verdict === 'hold' && standingOverride(finding, overrides) === null);
}
