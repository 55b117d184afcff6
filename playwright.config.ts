import { defineConfig } from '@playwright/test';
import { CHROMIUM, CHROMIUM_FLAGS } from './lib/launch/chromium';

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
    launchOptions: { executablePath: process.env.E2E_CHROMIUM ?? CHROMIUM, args: CHROMIUM_FLAGS },
  },
});
