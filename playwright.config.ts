import { defineConfig, devices } from '@playwright/test';
import { baseUrl } from './e2e/support/base-url';

const report = process.env.E2E_REPORT;

/**
 * Debian's own Chromium; nothing is downloaded. The pages under test are our own on loopback, so the sandbox, which root
 * and most containers cannot have, guards nothing here.
 */
const chromium = {
  executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
  args: [
    '--no-sandbox',
    '--disable-quic',
    '--no-first-run',
    '--disable-background-networking',
    '--disable-component-update',
    '--disable-sync',
  ],
};

/** Run by `npm test`, which serves a built app on a database of its own and names it in E2E_BASE_URL. */
export default defineConfig({
  testDir: 'e2e',
  testMatch: '**/*.spec.ts',
  outputDir: 'test-results',
  // A test that passes only the second time is broken, or shows that the app is.
  retries: 0,
  workers: 2,
  fullyParallel: true,
  forbidOnly: Boolean(process.env.CI),
  // Software drawing on two busy cores is slow; a story that hangs still ends.
  timeout: 150_000,
  globalTimeout: 25 * 60_000,
  expect: { timeout: 20_000 },
  reporter: report ? [['list'], ['json', { outputFile: report }]] : [['list']],
  use: {
    baseURL: baseUrl(),
    locale: 'en-GB',
    timezoneId: 'UTC',
    launchOptions: chromium,
    screenshot: 'only-on-failure',
    trace: 'retain-on-failure',
  },
  projects: [
    {
      name: 'desktop',
      grepInvert: /@phone-only/,
      use: { ...devices['Desktop Chrome'], viewport: { width: 1440, height: 900 } },
    },
    { name: 'phone', grep: /@phone/, use: { ...devices['Pixel 7'] } },
  ],
});
