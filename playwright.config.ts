import { defineConfig } from '@playwright/test';

const use = {
  baseURL: process.env.BASE_URL,
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
  forbidOnly: !!process.env.CI,
  reporter: [['list'], ['json', { outputFile: 'build/e2e.json' }]],
  use,
  projects: [
    { name: 'phone', use: { ...use, viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true } },
    { name: 'desk', use: { ...use, viewport: { width: 1440, height: 900 } } },
  ],
});
