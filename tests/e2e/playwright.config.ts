import { defineConfig } from '@playwright/test'
import { findTestServer } from '../support/test-addresses'

const server = findTestServer()
if (!server) throw new Error('Browser tests need a running build: start `node scripts/serve-test.mjs` in another terminal, or run `npm test`.')

export default defineConfig({
  testDir: '.',
  tsconfig: './tsconfig.json',
  testMatch: '**/*.spec.ts',
  outputDir: '../../test-results',
  // One served build and one database for all: the journeys go one after another.
  workers: 1,
  forbidOnly: true,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: process.env.TEST_JSON_FILE ? [['list'], ['json', { outputFile: process.env.TEST_JSON_FILE }]] : [['list']],
  use: {
    baseURL: server.TEST_BASE_URL,
    locale: 'en-GB',
    actionTimeout: 20_000,
    timezoneId: 'Europe/London',
    trace: 'retain-on-failure',
    screenshot: 'only-on-failure',
    // Video needs an encoder that Debian's Chromium does not bring.
    video: 'off',
    launchOptions: {
      executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
      args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync'],
    },
  },
})
