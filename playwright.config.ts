import { defineConfig } from '@playwright/test';

import { desk, phone } from './__tests__/e2e/support/sizes';

const use = {
  baseURL: process.env.BASE_URL,
  screenshot: 'only-on-failure' as const,
  actionTimeout: 20_000,
  navigationTimeout: 40_000,
  launchOptions: {
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  },
};

export default defineConfig({
  testDir: '__tests__/e2e',
  outputDir: 'build/e2e',
  workers: 2,
  fullyParallel: true,
  // a machine that builds beside the tests is slow, not wrong
  timeout: 90_000,
  expect: { timeout: 20_000 },
  forbidOnly: !!process.env.CI,
  reporter: [['list'], ['json', { outputFile: 'build/e2e.json' }]],
  use,
  projects: [
    { name: 'phone', use: { ...use, ...phone }, testIgnore: ['**/*.desk.spec.ts', '**/*.both.spec.ts'] },
    { name: 'desk', use: { ...use, ...desk }, testIgnore: ['**/*.phone.spec.ts', '**/*.both.spec.ts'] },
    // one after the other on both, because they change the same job
    { name: 'both', use: { ...use, ...desk }, testMatch: '**/*.both.spec.ts' },
  ],
});
