import { defineConfig } from '@playwright/test'

const port = Number(process.env.E2E_PORT ?? 4399)

export default defineConfig({
  testDir: '.',
  outputDir: '../../test-results/e2e',
  timeout: 60_000,
  expect: { timeout: 8000 },
  fullyParallel: false,
  workers: 2,
  forbidOnly: true,
  reporter: [['line'], ['json']],
  use: {
    baseURL: `http://127.0.0.1:${port}`,
    launchOptions: {
      executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
      args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync'],
    },
    locale: 'en-GB', timezoneId: 'Europe/London', trace: 'off',
  },
  projects: [
    { name: 'desk', use: { viewport: { width: 1440, height: 900 } } },
    { name: 'phone', use: { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true }, testMatch: /(wholeJob|accessibility)\.spec\.ts/ },
  ],
  webServer: { command: 'node --import tsx test/e2e/server.ts', cwd: '../..', url: `http://127.0.0.1:${port}/api/ready`, env: { PORT: String(port) }, timeout: 120_000, reuseExistingServer: false, stdout: 'ignore', stderr: 'pipe' },
})
