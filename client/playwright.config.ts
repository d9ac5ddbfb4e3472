// The browser tests: the built application, as it is shipped, in Debian's Chromium.
import { defineConfig, devices } from '@playwright/test';

const port = process.env['E2E_PORT'] ?? '4399';
const report = process.env['E2E_REPORT'];
const baseURL = `http://127.0.0.1:${port}`;

// Chromium runs no sandbox as root, and must ask nothing of the network.
const quietly = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export default defineConfig({
  testDir: 'e2e',
  outputDir: 'e2e/results',
  forbidOnly: true,
  retries: 0,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  workers: 1,
  reporter: report ? [['line'], ['json', { outputFile: report }]] : [['line']],
  use: {
    baseURL,
    locale: 'en-GB',
    timezoneId: 'UTC',
    screenshot: 'only-on-failure',
    launchOptions: { executablePath: '/usr/bin/chromium', args: quietly },
  },
  // A test tagged @desk or @phone runs only there; every other runs on both.
  projects: [
    {
      name: 'desk',
      grepInvert: /@phone/,
      use: { ...devices['Desktop Chrome'], viewport: { width: 1440, height: 900 } },
    },
    {
      name: 'phone',
      grepInvert: /@desk/,
      use: {
        ...devices['Desktop Chrome'],
        viewport: { width: 360, height: 740 },
        deviceScaleFactor: 2,
        hasTouch: true,
        isMobile: true,
      },
    },
  ],
  webServer: {
    command: 'node scripts/serve-for-tests.js',
    cwd: '..',
    env: { E2E_PORT: port },
    url: `${baseURL}/api/health`,
    timeout: 300_000,
    reuseExistingServer: false,
    gracefulShutdown: { signal: 'SIGTERM', timeout: 15_000 },
    stdout: 'pipe',
  },
});
