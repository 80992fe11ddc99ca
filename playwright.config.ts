import { defineConfig, devices } from '@playwright/test';
import { chromiumPath } from './lib/stack/chromium';
import { stackSettings } from './lib/stack/settings';

const { env, ports } = stackSettings('test', process.env, import.meta.dirname);
// A test in the making may be tried against the development server.
const baseURL = process.env['E2E_BASE_URL'] ?? `http://localhost:${ports.web}`;
// The tests speak to the inbox, the storage and the database by the same names as the product does.
if (process.env['E2E_BASE_URL'] === undefined) Object.assign(process.env, env);

export default defineConfig({
  testDir: 'tests/e2e',
  testMatch: '**/*.spec.ts',
  outputDir: 'test-results/e2e',
  // One browser at a time: the stack beside it needs the other core.
  workers: 1,
  retries: 0,
  timeout: 120_000,
  expect: { timeout: 15_000 },
  forbidOnly: process.env['E2E_BASE_URL'] === undefined,
  reporter: [['list'], ['json', { outputFile: 'test-results/e2e.json' }]],
  use: {
    ...devices['Desktop Chrome'],
    baseURL,
    viewport: { width: 1440, height: 900 },
    screenshot: 'only-on-failure',
    trace: 'retain-on-failure',
    launchOptions: {
      executablePath: chromiumPath(),
      args: [
        ...['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run'],
        ...['--disable-background-networking', '--disable-component-update', '--disable-sync'],
      ],
    },
  },
});
