import { execFileSync } from 'node:child_process';
import { writeFileSync } from 'node:fs';
import type { Page, TestInfo } from '@playwright/test';
import { findPdftotext } from '../../.ci/lib/chromium.mjs';
import { expect } from './journey.ts';

export type PaperSize = 'A4' | 'Letter';

/** A printed fill sheet, read back. */
export interface Paper {
  readonly pages: number;
  /** All its text in reading order, every run of blanks as one space. */
  readonly text: string;
  /** Words that reach out of the page or into its unprintable edge. */
  readonly outside: readonly string[];
}

/** Printers leave about 4 mm of every edge blank: 12 pt, at 72 pt an inch. */
const EDGE = 12;

/** Prints the page and reads the PDF back with poppler's pdftotext. */
export async function print(page: Page, size: PaperSize, info: TestInfo): Promise<Paper> {
  // The sheet is a chunk that comes right after the first plan; no hand is as fast as this function.
  await page.locator('article[aria-label="Fill sheet"]').waitFor({ state: 'attached' });
  const path = info.outputPath(`sheet-${size}-${performance.now().toFixed(0)}.pdf`);
  writeFileSync(path, await page.pdf({ format: size, printBackground: true }));
  const boxes = pdftotext(path, '-bbox');
  const pages = [...boxes.matchAll(/<page width="([\d.]+)" height="([\d.]+)">([\s\S]*?)<\/page>/g)];
  return {
    pages: pages.length,
    text: pdftotext(path, '-raw').replace(/\s+/g, ' ').trim(),
    outside: pages.flatMap(([, width, height, words]) => wordsOutside(words ?? '', Number(width), Number(height))),
  };
}

function wordsOutside(words: string, width: number, height: number): string[] {
  const box = /<word xMin="([\d.-]+)" yMin="([\d.-]+)" xMax="([\d.-]+)" yMax="([\d.-]+)">(.*?)<\/word>/g;
  return [...words.matchAll(box)].flatMap(([, xMin, yMin, xMax, yMax, word]) => {
    const inside = Number(xMin) >= EDGE && Number(yMin) >= EDGE && Number(xMax) <= width - EDGE && Number(yMax) <= height - EDGE;
    return inside ? [] : [word ?? ''];
  });
}

function pdftotext(path: string, mode: '-bbox' | '-raw'): string {
  const program = findPdftotext();
  if (program === undefined) throw new Error('pdftotext was not found; `npm test` installs it.');
  // A long report is more than Node's usual megabyte.
  return execFileSync(program, [mode, path, '-'], { encoding: 'utf8', maxBuffer: 64_000_000 });
}

/** One page, nothing at its edge, and every word of the sheet on the paper. */
export async function expectWholeSheet(page: Page, paper: Paper): Promise<void> {
  expect(paper.pages, 'pages').toBe(1);
  expect(paper.outside, 'words at the edge').toEqual([]);
  await page.emulateMedia({ media: 'print' });
  const words = (await page.getByRole('article', { name: 'Fill sheet' }).innerText()).split(/\s+/);
  await page.emulateMedia({ media: null });
  // A word broken over two lines is still whole without its blanks.
  const printed = paper.text.replaceAll(' ', '');
  expect(words.filter((word) => !printed.includes(word)), 'words that are not on the paper').toEqual([]);
  expect(words.length).toBeGreaterThan(100);
}
