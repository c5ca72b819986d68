import { defineConfig } from '@playwright/test';
import { launchOptions } from './.ci/lib/chromium.mjs';

const { executablePath, args } = launchOptions();
const port = process.env.FILLWRIGHT_TEST_PORT ?? '4180';
const address = `http://127.0.0.1:${port}/`;

export default defineConfig({
  testDir: 'tests/journeys',
  outputDir: 'test-results',
  // More than two browsers at once are slower, not faster, on a two-core machine.
  workers: 2,
  fullyParallel: true,
  forbidOnly: true,
  retries: 0,
  // The longest takes a quarter of this on an idle two-core machine.
  timeout: 120_000,
  reporter: [['list'], ['json', { outputFile: 'node_modules/.cache/results/playwright.json' }]],
  use: {
    baseURL: address,
    browserName: 'chromium',
    locale: 'en-GB',
    timezoneId: 'UTC',
    viewport: { width: 1280, height: 800 },
    trace: 'retain-on-failure',
    screenshot: 'only-on-failure',
    launchOptions: executablePath === undefined ? { args } : { args, executablePath },
  },
  webServer: {
    command: `"${process.execPath}" .ci/preview.mjs ${port}`,
    url: address,
    // Else a build served by somebody else could be what is tested.
    reuseExistingServer: false,
  },
});
