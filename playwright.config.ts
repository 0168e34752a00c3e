import { defineConfig } from '@playwright/test';
import { chromiumPath } from './tests/support/debian-tools.mjs';

const executablePath = chromiumPath();
if (!executablePath) throw new Error('Browser tests need Chromium: apt-get install -y chromium');

const port = 3210;

export default defineConfig({
  testDir: 'tests/browser',
  outputDir: 'test-results/browser',
  workers: 1,
  retries: 0,
  forbidOnly: true,
  timeout: 300_000,
  expect: { timeout: 30_000 },
  use: {
    baseURL: `http://localhost:${port}`,
    viewport: { width: 1440, height: 900 },
    locale: 'en-GB',
    timezoneId: 'Europe/Dublin',
    trace: 'retain-on-failure',
    launchOptions: {
      executablePath,
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
  webServer: {
    command: 'node tests/support/serve-for-browser.mjs',
    url: `http://localhost:${port}/sign-in`,
    reuseExistingServer: false,
    timeout: 300_000,
    stdout: 'pipe',
    gracefulShutdown: { signal: 'SIGTERM', timeout: 5_000 },
    env: {
      PORT: String(port),
      NEXTAUTH_URL: `http://localhost:${port}`,
      NEXTAUTH_SECRET: 'only-for-browser-tests',
      DATABASE_FILE: 'var/browser-test/floorwright.db',
      MAIL_FOLDER: 'var/browser-test/mail',
      CLOCK_STARTS_AT: '2027-01-14T09:00:00Z',
    },
  },
});
