import { defineConfig } from '@playwright/test';

/** `npm run e2e` starts the server and says where it is. */
const address = process.env['E2E_URL'] ?? process.env['BASE_URL'];

const root = process.getuid?.() === 0;

export default defineConfig({
  testDir: 'e2e/journeys',
  outputDir: 'test-results/journeys',
  fullyParallel: true,
  workers: 2,
  retries: 0,
  timeout: 60_000,
  reporter: [['list']],
  use: {
    ...(address === undefined ? {} : { baseURL: address }),
    browserName: 'chromium',
    locale: 'en-GB',
    trace: 'retain-on-failure',
    launchOptions: {
      // Debian's own browser; its sandbox does not start as root.
      executablePath: '/usr/bin/chromium',
      args: root ? ['--no-sandbox'] : [],
    },
  },
});
