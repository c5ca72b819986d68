import { expect } from 'vitest';

/** What holds for every sentence shown to a person. */
export function expectSentence(text: string): void {
  expect(text).not.toMatch(/undefined|NaN|Infinity|null|\[object|\$\{/);
  expect(text).not.toMatch(/\bsafe\b|OK to fill|\bppm\b|\bppb\b/i);
  expect(text).toMatch(/[.!?]$/);
  expect(text.length).toBeGreaterThan(12);
  // A pressure says against what it is measured.
  for (const [pressure] of text.matchAll(/\d [a-zA-Z]*bar\b.{0,10}/g)) expect(pressure).toMatch(/gauge|absolute/);
}
