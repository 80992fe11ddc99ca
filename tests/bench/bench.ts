import { spawn } from 'node:child_process';

import { encode } from 'next-auth/jwt';
import pg from 'pg';

import { createDatabase, dropDatabase } from '@/db/cluster';
import { prepareDatabase } from '@/lib/stack/prepare-database';
import { env } from '@/lib/env';

import { dispatches } from './dispatches';
import { BATCHES, fill, LOTS } from './fill';
import { measure, measureEach, type Measured } from './measure';

const PORT = 7600;
const BASE = `http://localhost:${PORT}`;
const COOKIE = 'authjs.session-token';
const DATABASE = 'lotwright_bench';

/**
 * Fills a database of its own and measures the built web server on it: pages beside a bare dynamic page, lists beside
 * a bare `select 1` route, all in one run. Figures of another run or machine are not to be compared; ratios are.
 */
async function main(): Promise<void> {
  const superUrl = urlOf(env.DATABASE_OWNER_URL, 'postgres', 'postgres');
  await dropDatabase(superUrl, DATABASE);
  await createDatabase(superUrl, DATABASE);
  const ownerUrl = urlOf(env.DATABASE_OWNER_URL, null, DATABASE);
  const appUrl = urlOf(env.DATABASE_URL, null, DATABASE);
  await prepareDatabase(ownerUrl);
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  console.log(
    `Filling ${LOTS.toLocaleString('en-US')} lots and ${BATCHES.toLocaleString('en-US')} batches …`,
  );
  const filled = await fill(client);
  await client.end();

  const server = spawn(process.execPath, ['node_modules/next/dist/bin/next', 'start', '-p', String(PORT)], {
    env: {
      ...process.env,
      DATABASE_URL: appUrl,
      DATABASE_OWNER_URL: ownerUrl,
      APP_URL: BASE,
      NODE_ENV: 'production',
      LOG_LEVEL: 'warn',
    },
    stdio: ['ignore', 'ignore', 'inherit'],
  });
  try {
    await untilUp();
    const token = await encode({
      token: { claims: { kind: 'person', userId: filled.userId, sessionVersion: 1, shopId: filled.shopId } },
      secret: env.AUTH_SECRET,
      salt: COOKIE,
    });
    const headers = { cookie: `${COOKIE}=${token}` };
    const barePage = await measure('bare dynamic page', `${BASE}/dev/bare`);
    const bareRoute = await measure('bare select 1 route', `${BASE}/api/dev/bare`);
    const pages = [
      await measure('first screen', `${BASE}/`, headers),
      await measure('batch list', `${BASE}/batches`, headers),
      await measure('one batch', `${BASE}/batches/${filled.batchId}`, headers),
    ];
    const lists = [
      await measure('GET /api/batches', `${BASE}/api/batches`, headers),
      await measure('GET /api/lots', `${BASE}/api/lots`, headers),
      await measure('search', `${BASE}/api/search?text=B-199`, headers),
    ];
    const dispatched = await measureEach(
      'dispatch, one after the other',
      await dispatches(appUrl, filled, { base: BASE, headers }),
    );
    print([
      [barePage, null],
      ...pages.map((one) => [one, barePage] as const),
      [bareRoute, null],
      ...lists.map((one) => [one, bareRoute] as const),
      [dispatched, bareRoute],
    ]);
  } finally {
    server.kill('SIGTERM');
    await dropDatabase(superUrl, DATABASE).catch(() => undefined);
  }
}

function print(rows: readonly (readonly [Measured, Measured | null])[]): void {
  console.log(
    `${'what'.padEnd(32)}${'p50 ms'.padStart(9)}${'p95'.padStart(9)}${'p99'.padStart(9)}${'req/s'.padStart(9)}   p50 against bare`,
  );
  for (const [one, bare] of rows) {
    const figures = [one.p50, one.p95, one.p99, one.perSecond]
      .map((figure) => String(figure).padStart(9))
      .join('');
    console.log(
      `${one.name.padEnd(32)}${figures}   ${bare ? `${(one.p50 / bare.p50).toFixed(2)} × ${bare.name}` : ''}`,
    );
  }
}

function urlOf(given: string, user: string | null, database: string): string {
  const url = new URL(given);
  if (user !== null) url.username = user;
  url.pathname = `/${database}`;
  return url.href;
}

async function untilUp(): Promise<void> {
  for (let tries = 0; tries < 120; tries++) {
    const response = await fetch(`${BASE}/api/health`).catch(() => null);
    if (response?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, 250));
  }
  throw new Error('The web server did not come up. Is it built? Run npm start once.');
}

await main();
