import pg from 'pg';

import { makeOwnDatabase, signedIn, startWeb } from './built-server';
import { dispatches } from './dispatches';
import { BATCHES, fill, LOTS } from './fill';
import { measure, measureEach, type Measured } from './measure';

const BASE = 'http://localhost:7600';

/**
 * Fills a database of its own and measures the built web server on it: pages beside a bare dynamic page, lists beside
 * a bare `select 1` route, all in one run. Figures of another run or machine are not to be compared; ratios are.
 */
async function main(): Promise<void> {
  const database = await makeOwnDatabase('lotwright_bench');
  const client = new pg.Client({ connectionString: database.ownerUrl });
  await client.connect();
  console.log(
    `Filling ${LOTS.toLocaleString('en-US')} lots and ${BATCHES.toLocaleString('en-US')} batches …`,
  );
  const filled = await fill(client);
  await client.end();

  const server = await startWeb(database, BASE);
  try {
    const headers = await signedIn(filled);
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
      await dispatches(database.appUrl, filled, { base: BASE, headers }),
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
    await database.drop();
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

await main();
