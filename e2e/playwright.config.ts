import { defineConfig } from '@playwright/test';

const isCi = process.env.CI !== undefined;

/** Each worker starts a server and a database of its own (see fixtures); two cores bear two. */
export default defineConfig({
  testDir: 'journeys',
  outputDir: '../test-results',
  fullyParallel: true,
  forbidOnly: isCi,
  // Once more where the machine is shared; a second failure counts, and a flaky test is named as one.
  retries: isCi ? 1 : 0,
  workers: 2,
  timeout: 180_000,
  expect: { timeout: 15_000 },
  reporter: [['list'], ['json', { outputFile: '../test-results/report.json' }]],
  use: {
    browserName: 'chromium',
    locale: 'en-US',
    timezoneId: 'America/New_York',
    actionTimeout: 15_000,
    navigationTimeout: 20_000,
    screenshot: 'only-on-failure',
    launchOptions: {
      executablePath: '/usr/bin/chromium',
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-quic',
        '--no-first-run',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
      ],
    },
  },
  projects: [
    {
      name: 'phone',
      grepInvert: /@desktop/,
      use: {
        viewport: { width: 390, height: 844 },
        deviceScaleFactor: 2,
        hasTouch: true,
        isMobile: true,
      },
    },
    {
      name: 'desktop',
      grepInvert: /@phone/,
      use: { viewport: { width: 1440, height: 900 } },
    },
  ],
});
