import { defineConfig } from 'vitest/config';
import { stackSettings } from './lib/stack/settings';

const root = import.meta.dirname;
const { env } = stackSettings('test', process.env, root);
const alias = { '@': root };

/** Three kinds of tests: without anything, against real services on this machine, and with processes being killed. */
export default defineConfig({
  resolve: { alias },
  test: {
    // What a machine is busy with must not decide about a test.
    testTimeout: 15_000,
    env: { ...env, LOG_LEVEL: process.env['LOG_LEVEL'] ?? 'silent' },
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          include: ['tests/{unit,reference,architecture}/**/*.test.{ts,tsx}'],
        },
      },
      {
        extends: true,
        test: {
          name: 'services',
          include: ['tests/{services,api}/**/*.test.{ts,tsx}'],
          globalSetup: ['tests/services/global-setup.ts'],
          testTimeout: 60_000,
          hookTimeout: 120_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'faults',
          include: ['tests/faults/**/*.test.ts'],
          globalSetup: ['tests/services/global-setup.ts', 'tests/faults/bundle-parts.ts'],
          // Each file kills servers of its own; two at once would only measure the machine.
          fileParallelism: false,
          testTimeout: 900_000,
          hookTimeout: 300_000,
        },
      },
    ],
  },
});
