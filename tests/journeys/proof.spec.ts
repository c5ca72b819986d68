import AxeBuilder from '@axe-core/playwright';
import { programVersion } from '../../.ci/lib/project.mjs';
import { loadProof } from '../../src/blending/index.ts';
import { goTo, start } from './desk.ts';
import { expect, test } from './journey.ts';
import { print } from './paper.ts';

test('the proof runs to its end in the browser, all within, and prints as a dated report', async ({ page }, info) => {
  const { proofGroups, proofSize, dataDigest } = await loadProof();
  const groups = proofGroups();
  const total = proofSize(groups);
  const digest = await dataDigest(groups);
  // A headless browser has no print dialogue: the page must wait as it would wait for one.
  await page.addInitScript(() => { window.print = () => { document.body.dataset.printed = 'asked'; }; });
  await start(page);
  const sheetBefore = (await print(page, 'A4', info)).text;
  const run = page.getByRole('button', { name: 'Run the proof' });
  const progress = page.getByRole('progressbar', { name: 'progress of the proof' });

  await test.step('it can be stopped', async () => {
    await goTo(page, 'Proof');
    await run.click();
    await expect(progress).toBeVisible();
    await page.getByRole('button', { name: 'Stop' }).click();
    await expect(page.getByText('Stopped before the end.')).toBeVisible();
    await expect(page.getByRole('button', { name: 'Print the report' })).toBeDisabled();
  });

  await test.step('it goes on while another view is open, and ends with every case within', async () => {
    await run.click();
    await goTo(page, 'Plan');
    await expect(page.getByRole('heading', { name: 'Fill ladder' })).toBeVisible();
    await goTo(page, 'Proof');
    await expect(page.getByText(`${String(total)} of ${String(total)} cases computed: ${String(total)} within their tolerance, 0 outside.`)).toBeVisible({ timeout: 60_000 });
    await expect(page.getByText('Finished in')).toBeVisible();
    // The browser counts with the very data that were checked here.
    await expect(page.getByRole('main').getByText(digest)).toBeVisible();
  });

  await test.step('the cases, by group', async () => {
    const cases = page.getByRole('group', { name: 'cases' });
    await expect(cases.getByText('● within')).toHaveCount(total);
    await page.getByLabel('show', { exact: true }).selectOption({ label: 'Flammable and oxidising, ISO 10156' });
    await expect(cases.getByText('● within')).toHaveCount(9);
    await expect(cases.getByRole('row').filter({ hasText: 'H4' })).toContainText('27.33');
    await page.getByLabel('show', { exact: true }).selectOption('only what is outside');
    await expect(cases.getByText('None.')).toBeVisible();
  });

  await test.step('no axe violation with its results shown', async () => {
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${String(nodes[0]?.target)}`)).toEqual([]);
  });

  await test.step('the report', async () => {
    await page.getByRole('button', { name: 'Print the report' }).click();
    await expect(page.locator('body')).toHaveAttribute('data-printed', 'asked');
    const paper = await print(page, 'A4', info);
    expect(paper.outside).toEqual([]);
    expect(paper.pages).toBeGreaterThan(5);
    const agent = await page.evaluate(() => navigator.userAgent);
    const year = String(new Date().getFullYear());
    for (const words of ['Proof report', `Fillwright ${programVersion()}`, year, `${String(total)} cases: ${String(total)} within their tolerance, 0 outside`, 'ISO/IEC 17025', 'Reviewed by, date']) {
      expect(paper.text).toContain(words);
    }
    // Long words break over lines.
    const whole = paper.text.replaceAll(' ', '');
    expect(whole).toContain(digest);
    expect(whole).toContain(agent.replaceAll(' ', ''));
    expect(whole.match(/●within/g)).toHaveLength(total);
  });

  await test.step('afterwards the fill sheet prints again, as the same revision', async () => {
    expect((await print(page, 'A4', info)).text).toBe(sheetBefore);
  });
});
