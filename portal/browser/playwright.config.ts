import { defineConfig } from '@playwright/test';

/** Journeys through the built product; who starts it says where it is in FERRITE_BASE_URL. */
export default defineConfig({
  testDir: '.',
  testMatch: '*.journey.ts',
  outputDir: '../test-results',
  workers: 2,
  retries: 0,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: [
    ['list'],
    ['json', { outputFile: process.env.FERRITE_BROWSER_REPORT ?? '../test-results/report.json' }],
  ],
  use: {
    baseURL: process.env.FERRITE_BASE_URL ?? 'http://127.0.0.1:4780',
    screenshot: 'only-on-failure',
    locale: 'en-GB',
    timezoneId: 'Europe/London',
    viewport: { width: 1440, height: 900 },
    actionTimeout: 10_000,
    launchOptions: { executablePath: process.env.FERRITE_CHROMIUM ?? '/usr/bin/chromium' },
  },
});
