import { resolve } from 'node:path'
import { defineConfig } from '@playwright/test'
import { CHROMIUM } from './chromium'

const root = resolve(import.meta.dirname, '../..')

export default defineConfig({
  testDir: import.meta.dirname,
  globalSetup: resolve(import.meta.dirname, 'global-setup.ts'),
  outputDir: resolve(root, '.data/browser-tests'),
  tsconfig: resolve(root, 'tsconfig.json'),
  fullyParallel: true,
  workers: 2,
  retries: 0,
  forbidOnly: true,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  use: {
    locale: 'en-GB',
    timezoneId: 'Europe/London',
    viewport: { width: 1440, height: 900 },
    launchOptions: CHROMIUM,
    screenshot: 'only-on-failure',
  },
})
