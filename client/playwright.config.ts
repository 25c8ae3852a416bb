import { join } from 'node:path'
import { defineConfig } from '@playwright/test'
import { address } from './e2e/support/address'
import { runFolder } from './e2e/support/sign-ins'

export default defineConfig({
  testDir: 'e2e',
  outputDir: join(runFolder, 'browser-tests'),
  // One at a time: some stories put other rules in force, and what others rest on would change under them.
  workers: 1,
  retries: 0,
  forbidOnly: true,
  timeout: 120_000,
  expect: { timeout: 15_000 },
  use: {
    baseURL: address,
    viewport: { width: 1440, height: 900 },
    screenshot: 'only-on-failure',
    launchOptions: {
      executablePath: '/usr/bin/chromium',
      // Nothing but the product's own requests leaves the browser.
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
})
