import { defineConfig } from '@playwright/test';

const report = process.env['PLAYWRIGHT_REPORT'];

/** Chromium's sandbox needs an ordinary user. */
const forRoot = process.getuid?.() === 0 ? ['--no-sandbox'] : [];

export default defineConfig({
  testDir: 'e2e',
  testMatch: '**/*.spec.ts',
  outputDir: 'test-results',
  workers: 2,
  fullyParallel: true,
  forbidOnly: true,
  timeout: 60_000,
  reporter: [['list'], ...(report === undefined ? [] : [jsonReport(report)])],
  use: {
    baseURL: process.env['BASE_URL'] ?? 'http://127.0.0.1:4173',
    trace: 'retain-on-failure',
    launchOptions: {
      executablePath: process.env['CHROMIUM'] ?? '/usr/bin/chromium',
      args: forRoot,
    },
  },
});

function jsonReport(outputFile: string): ['json', { outputFile: string }] {
  return ['json', { outputFile }];
}
