import { mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { parseEnvironment } from '@/lib/env';
import { stackSettings } from '@/lib/stack/settings';
import { sum, tallyPlaywright, tallyVitest } from '@/lib/stack/tally';

let root: string;
beforeAll(() => {
  root = mkdtempSync(join(tmpdir(), 'lotwright-settings-'));
});
afterAll(() => rmSync(root, { recursive: true }));

describe('the settings of the local stack', () => {
  test('everything runs here while nothing is named', () => {
    const { runsHere, env } = stackSettings('local', {}, root);
    expect(runsHere).toEqual({ database: true, mail: true, storage: true, payments: true });
    expect(() => parseEnvironment(env)).not.toThrow();
  });

  test('a service with an address is used and not started', () => {
    const given = {
      SMTP_URL: 'smtp://mail.example.test',
      STRIPE_SECRET_KEY: 'sk',
      STRIPE_WEBHOOK_SECRET: 'wh',
    };
    const { runsHere, env } = stackSettings('local', given, root);
    expect(runsHere).toMatchObject({ database: true, mail: false, storage: true, payments: false });
    expect(env).not.toHaveProperty('SMTP_URL');
    expect(env).not.toHaveProperty('STRIPE_API_BASE');
  });

  test('half a database is refused by name', () => {
    expect(() => stackSettings('local', { DATABASE_URL: 'postgresql://a' }, root)).toThrow(
      'DATABASE_OWNER_URL',
    );
  });

  test('the secret is made once, kept, and read by nobody else', () => {
    const first = stackSettings('local', {}, root).env['AUTH_SECRET'];
    expect(stackSettings('local', {}, root).env['AUTH_SECRET']).toBe(first);
    const file = join(root, '.data', 'auth-secret');
    expect(readFileSync(file, 'utf8')).toBe(first);
    expect(statSync(file).mode & 0o077).toBe(0);
  });

  test('tests never touch a real service, whatever the machine has set', () => {
    const given = {
      DATABASE_URL: 'postgresql://real',
      DATABASE_REPLICA_URL: 'postgresql://real',
      SMTP_URL: 'smtp://real',
      S3_ENDPOINT: 'https://real',
      STRIPE_SECRET_KEY: 'sk_live_real',
    };
    const { runsHere, env } = stackSettings('test', given, root);
    expect(runsHere).toEqual({ database: true, mail: true, storage: true, payments: true });
    expect(JSON.stringify(parseEnvironment({ ...given, ...env }))).not.toContain('real');
  });

  test('the tests have ports of their own', () => {
    const local = Object.values(stackSettings('local', {}, root).ports);
    const forTests = Object.values(stackSettings('test', {}, root).ports);
    expect(local.filter((port) => forTests.includes(port))).toEqual([]);
  });
});

describe('the last line of a test run', () => {
  const report = (name: string, content: unknown) => {
    const file = join(root, name);
    writeFileSync(file, JSON.stringify(content));
    return file;
  };

  test('adds passes and failures', () => {
    const file = report('a.json', { numPassedTests: 7, numFailedTests: 2, testResults: [] });
    expect(sum([tallyVitest(file, 1), { passed: 1, failed: 0 }])).toEqual({ passed: 8, failed: 2 });
  });

  test('counts a file that could not even be loaded', () => {
    const testResults = [{ status: 'failed', assertionResults: [] }];
    const file = report('b.json', { numPassedTests: 7, numFailedTests: 0, testResults });
    expect(tallyVitest(file, 1)).toEqual({ passed: 7, failed: 1 });
  });

  test('counts a runner that died without a report, and one that found no tests', () => {
    expect(tallyVitest(join(root, 'absent.json'), 137)).toEqual({ passed: 0, failed: 1 });
    const file = report('c.json', { numPassedTests: 0, numFailedTests: 0, testResults: [] });
    expect(tallyVitest(file, 0)).toEqual({ passed: 0, failed: 1 });
  });

  test('counts a browser test that passed only when tried again as failed', () => {
    const file = report('d.json', { stats: { expected: 5, unexpected: 0, flaky: 1, skipped: 0 } });
    expect(tallyPlaywright(file, 0)).toEqual({ passed: 5, failed: 1 });
  });
});
