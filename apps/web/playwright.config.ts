import { defineConfig } from '@playwright/test';
import { browserSettings } from './e2e/harness/browserSettings';

const { publicUrl, resultsDir } = browserSettings();

export default defineConfig({
  testDir: './e2e',
  /** The walks are tests. Pictures of every page and the time until a sheet can be read are commands of their own. */
  projects: [
    { name: 'walks', testMatch: '*.spec.ts' },
    { name: 'shots', testMatch: 'shots/*.shots.ts' },
    { name: 'speed', testMatch: 'speed/*.speed.ts' },
  ],
  outputDir: `${resultsDir}/browser`,
  globalSetup: './e2e/harness/startApplication.ts',
  reporter: [['list'], ['json', { outputFile: `${resultsDir}/playwright.json` }]],
  /** Two cores carry the browser, the API, the worker and the database: one walk at a time. */
  workers: 1,
  /** A walk that passes only the second time is a failure. */
  retries: 0,
  forbidOnly: Boolean(process.env.CI),
  /** Measuring a take on a busy machine may take most of a minute. */
  timeout: 180_000,
  expect: { timeout: 15_000 },
  use: {
    baseURL: publicUrl,
    trace: 'retain-on-failure',
    screenshot: 'only-on-failure',
    video: 'off',
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
        '--autoplay-policy=no-user-gesture-required',
      ],
    },
  },
});
