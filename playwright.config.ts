import { existsSync } from 'node:fs';
import { defineConfig, type PlaywrightTestOptions } from '@playwright/test';

const browsers = ['/usr/bin/chromium-headless-shell', '/usr/bin/chromium'];
const launchOptions = {
  executablePath: process.env.CHROMIUM_PATH ?? browsers.find((path) => existsSync(path)),
  args: ['--no-sandbox', '--disable-dev-shm-usage', '--disable-gpu'],
};

const desktop = { viewport: { width: 1440, height: 900 } };
const phone = { viewport: { width: 390, height: 844 }, isMobile: true, hasTouch: true, deviceScaleFactor: 2 };
const tablet = { viewport: { width: 820, height: 1180 }, hasTouch: true };

/** A journey tagged @wide or @phone is too long, or too much of one size, to be gone in all of them. */
const project = (name: string, use: Partial<PlaywrightTestOptions>) => ({
  name,
  use: { ...use, launchOptions },
  grepInvert: { desktop: /@phone/, phone: /@wide/ }[name] ?? /@phone|@wide/,
});

const usual = [
  project('desktop', { ...desktop, colorScheme: 'light' }),
  project('phone', { ...phone, colorScheme: 'dark' }),
];
/** The rest of the matrix, for `npm run test:long`. */
const rest = [
  project('desktop-dark', { ...desktop, colorScheme: 'dark' }),
  project('phone-light', { ...phone, colorScheme: 'light' }),
  project('tablet', { ...tablet, colorScheme: 'light' }),
];

/** The journeys run against a stack that scripts/test.mjs has started and seeded; by hand, against `npm start`. */
export default defineConfig({
  testDir: 'tests/e2e',
  outputDir: '.local/e2e/results',
  reporter: [['list'], ['json', { outputFile: process.env.E2E_REPORT_FILE ?? '.local/e2e/report.json' }]],
  workers: 2,
  retries: 0,
  forbidOnly: true,
  timeout: 90_000,
  expect: { timeout: 10_000 },
  use: {
    baseURL: process.env.E2E_BASE_URL ?? 'http://localhost:4400',
    locale: 'en-GB',
    timezoneId: 'Europe/Vienna',
    actionTimeout: 20_000,
    // Snapshots would fetch a page's blobs, which the content policy refuses and the watch would report.
    trace: { mode: 'retain-on-failure', snapshots: false, screenshots: true, sources: true },
    screenshot: 'only-on-failure',
  },
  projects: process.env.LYDITE_LONG ? [...usual, ...rest] : usual,
});
