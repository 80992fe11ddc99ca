import { expect, test } from 'vitest';

import { GET as health } from '@/app/api/health/route';
import { GET as openapi } from '@/app/api/openapi.json/route';
import { GET as ready } from '@/app/api/ready/route';
import { connect } from '@/db/client';
import { ALL_ENDPOINTS } from '@/lib/api/all-endpoints';
import { readableOperation } from '@/lib/api/readable-operation';
import { checkReadiness } from '@/lib/readiness/check-readiness';

import { openApi } from './harness';

const base = openApi();

test('alive is one thing, ready another: each that is needed is named with its time', async () => {
  expect(await health().json()).toEqual({ live: true });
  const response = await ready();
  expect(response.status).toBe(200);
  const { checks } = (await response.json()) as { checks: { name: string; ok: boolean; ms: number }[] };
  expect(checks.map(({ name, ok }) => [name, ok])).toEqual([
    ['database', true],
    ['storage', true],
    ['mail', true],
    ['queue', true],
  ]);
});

test('without its database the server is not ready, and still says so', async () => {
  const { db, pool } = connect('postgresql://lotwright_app@127.0.0.1:1/none', 1);
  const readiness = await checkReadiness(db, db);
  expect(readiness.ready).toBe(false);
  expect(readiness.checks.filter(({ ok }) => !ok).map(({ name }) => name)).toEqual(['database', 'queue']);
  await pool.end();
});

test('a replica is asked beside its primary', async () => {
  const { db, pool } = connect('postgresql://lotwright_app@127.0.0.1:1/none', 1);
  const { checks } = await checkReadiness(base.db, db);
  expect(checks.find(({ name }) => name === 'replica')).toMatchObject({ ok: false });
  await pool.end();
});

interface Document {
  openapi: string;
  paths: Record<
    string,
    Record<
      string,
      {
        operationId: string;
        parameters: { name: string; in: string }[];
        'x-permission': string;
        security?: unknown[];
      }
    >
  >;
}

test('the file for programs holds every read and write, with its permission and its parameters', async () => {
  const document = (await openapi().json()) as Document;
  expect(document.openapi).toBe('3.1.0');
  const operations = Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.values(methods).map((operation) => ({ path, ...operation })),
  );
  expect(operations.map(({ operationId }) => operationId).sort()).toEqual(
    ALL_ENDPOINTS.map(({ declaration }) => declaration.id).sort(),
  );
  for (const { path, parameters, ...operation } of operations) {
    const named = [...path.matchAll(/\{(\w+)\}/g)].map((match) => match[1]);
    expect(parameters.filter((parameter) => parameter.in === 'path').map(({ name }) => name)).toEqual(named);
    expect(operation['x-permission']).toMatch(/^[a-z]+\.[a-z_]+$/);
  }
});

test('the page for programs says the same in words', () => {
  const operations = ALL_ENDPOINTS.map(({ declaration }) => readableOperation(declaration));
  expect(operations).toHaveLength(ALL_ENDPOINTS.length);
  const invite = operations.find(({ id }) => id === 'invitePerson');
  expect(invite?.input).toEqual(
    expect.arrayContaining([
      expect.objectContaining({ name: 'email', required: true }),
      expect.objectContaining({
        name: 'roles',
        kind: 'list of one of lead, inspector, office, admin, auditor',
        limits: 'at least 1 entries',
      }),
    ]),
  );
});
