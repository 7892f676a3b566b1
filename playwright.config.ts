// Journeys in Debian's Chromium against the running product; `npm test -- e2e` starts it and says where it is.
import { defineConfig } from '@playwright/test'

const baseURL = process.env.BASE_URL
if (!baseURL) throw new Error('BASE_URL is missing: start the journeys with `npm run e2e`.')

export default defineConfig({
  testDir: 'tests/e2e',
  outputDir: '.data/test/e2e',
  // One after the other: the journeys share a server, its worker and two cores with them.
  workers: 1,
  fullyParallel: false,
  forbidOnly: true,
  timeout: 120_000,
  expect: { timeout: 30_000 },
  reporter: [['list'], ['json', { outputFile: process.env.E2E_REPORT ?? '.data/test/e2e.json' }]],
  use: {
    baseURL,
    browserName: 'chromium',
    locale: 'en-CA',
    screenshot: 'only-on-failure',
    trace: 'retain-on-failure',
    launchOptions: {
      executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
      // Root may not use the sandbox, and /dev/shm is tiny in containers.
      args: ['--no-sandbox', '--disable-dev-shm-usage', '--disable-gpu'],
    },
  },
})
