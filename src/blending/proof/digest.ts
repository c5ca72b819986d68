/** One number for all the numbers: what a report names so that a later one can be told to rest on the same data. */
import { canonicalJson, checksum } from '../recipe/file/identity.ts';
import { gasIds, publishedData } from '../../thermo/index.ts';
import { gasFacts } from '../gases/facts.ts';
import type { ProofGroup } from './case.ts';

/**
 * SHA-256, 64 hexadecimal digits, over the coefficients and gas data as they were
 * loaded, the hazard figures of every gas, and the statements of every case
 * (published value, tolerance, source). Equal data give equal digits on every machine.
 */
export async function dataDigest(groups: readonly ProofGroup[]): Promise<string> {
  const statements = groups.map(({ id, why, cases }) => ({
    id, why, cases: cases.map(({ id: caseId, title, source, trust, published, unit, tolerance, remark }) => (
      { id: caseId, title, source, trust, published, unit, tolerance, remark })),
  }));
  return checksum(canonicalJson(textsOnly({ coefficients: await publishedData(), hazards: gasIds.map((gas) => gasFacts(gas)), statements })));
}

/** Numbers as the shortest text that reads back as the same number, so that the canonical form is one of texts. */
function textsOnly(value: unknown): string | readonly (string | object)[] | object {
  if (Array.isArray(value)) return value.map(textsOnly);
  if (typeof value === 'object' && value !== null) {
    return Object.fromEntries(Object.entries(value).filter(([, field]) => field !== undefined).map(([key, field]) => [key, textsOnly(field)]));
  }
  return String(value);
}
