import { defineConfig } from '@playwright/test';

/** The tests start servers of their own on free ports (tests/browser/club.ts), so that none sees another's book. */
export default defineConfig({
  testDir: '../tests/browser',
  outputDir: '../.cache/browser',
  globalSetup: '../tests/browser/global-setup.ts',
  timeout: 300_000,
  workers: 2,
  fullyParallel: false,
  forbidOnly: true,
  retries: 0,
  use: {
    launchOptions: {
      executablePath: '/usr/bin/chromium',
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
    trace: 'off',
  },
});
