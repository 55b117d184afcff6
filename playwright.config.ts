import { defineConfig } from '@playwright/test';

/** Flags with which Debian's Chromium runs as root, without a screen and without calling home. */
const CHROMIUM_FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

// `npm test -- e2e` starts the application and says where it is.
export default defineConfig({
  testDir: './tests/e2e',
  outputDir: './.local/e2e',
  workers: 1,
  retries: 0,
  forbidOnly: true,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: [['list'], ['json']],
  use: {
    baseURL: process.env.E2E_ADDRESS ?? 'http://127.0.0.1:3000',
    viewport: { width: 1280, height: 900 },
    locale: 'en-US',
    timezoneId: 'America/New_York',
    screenshot: 'only-on-failure',
    launchOptions: { executablePath: process.env.E2E_CHROMIUM ?? '/usr/bin/chromium', args: CHROMIUM_FLAGS },
  },
});
