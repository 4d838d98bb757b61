import { defineConfig, devices } from '@playwright/test';

/** `npm test` builds, seeds and serves, and says here where. */
const baseURL = process.env.PLUMBROW_TEST_URL ?? 'http://localhost:3000';

export default defineConfig({
  testDir: 'tests/browser',
  outputDir: 'tests/browser/.results',
  // One office, one server: the journeys follow one another.
  workers: 1,
  fullyParallel: false,
  forbidOnly: true,
  retries: 0,
  timeout: 90_000,
  expect: { timeout: 15_000 },
  use: {
    ...devices['Desktop Chrome'],
    baseURL,
    locale: 'en-GB',
    timezoneId: 'Europe/London',
    viewport: { width: 1360, height: 900 },
    screenshot: 'only-on-failure',
    trace: 'retain-on-failure',
    launchOptions: {
      executablePath: process.env.PLUMBROW_CHROMIUM ?? '/usr/bin/chromium',
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-dev-shm-usage',
        '--disable-background-networking',
        '--disable-component-update',
        '--no-first-run',
      ],
    },
  },
  projects: [{ name: 'chromium' }],
});
