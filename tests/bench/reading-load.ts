import type { ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { loadavg } from 'node:os';

import { count, eq } from 'drizzle-orm';

import { connect } from '@/db/client';
import { readings } from '@/db/schema/readings';

import { makeDispatchedBatch } from '../factories/batches';
import { handIn } from '../factories/papers';
import { makeWorld } from '../factories/world';
import { LAYOUTS } from '../evidence/generate/layouts';
import { makeCertificate } from '../evidence/generate/make-certificate';
import { makeOwnDatabase, signedIn, startAt, startWeb } from './built-server';
import { measureWhile, type Measured } from './measure';

const BASE = 'http://localhost:7610';
const WORKER_PORT = '7611';
const SCANS = 20;
/** Calls a second: some twenty people at their screens. */
const PER_SECOND = 10;
const ROUNDS = { warmUp: 1, idle: 3, reading: 30 };

/**
 * The built web server's answers while the worker reads twenty scans, beside its answers while nothing is read, in one
 * run. Everything listens on this machine alone, and ends by itself: when all is read, or after five minutes.
 */
async function main(): Promise<void> {
  const database = await makeOwnDatabase('lotwright_reading_load');
  const [app, owner] = [connect(database.appUrl), connect(database.ownerUrl, 4)];
  const processes: ChildProcess[] = [];
  const end = () => processes.forEach((one) => one.kill('SIGTERM'));
  // Ended from outside, it leaves no process behind.
  process.once('SIGTERM', () => {
    end();
    process.exit(1);
  });
  try {
    const world = await makeWorld(app.db, owner.db);
    const batch = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId));
    console.log(`Making ${SCANS} scans …`);
    for (let seed = 1; seed <= SCANS; seed++) {
      const { bytes, name } = await makeCertificate(seed, LAYOUTS, 'scan');
      await handIn(world, batch.id, { kind: 'certificate', name, content: Buffer.from(bytes) });
    }
    processes.push(await startWeb(database, BASE));
    const headers = await signedIn(world);
    const asked = { url: `${BASE}/batches/${batch.id}`, headers, perSecond: PER_SECOND };
    const always = () => Promise.resolve(true);
    await measureWhile('warm-up', { ...asked, rounds: ROUNDS.warmUp }, always);
    const idle = await measureWhile('nothing is read', { ...asked, rounds: ROUNDS.idle }, always);

    processes.push(
      startAt(['--import', 'tsx', 'lib/jobs/worker.ts'], database, { WORKER_PORT, APP_URL: BASE }),
    );
    const began = performance.now();
    const waiting = async () => {
      const [row] = await owner.db
        .select({ left: count() })
        .from(readings)
        .where(eq(readings.state, 'waiting'));
      return row?.left ?? 0;
    };
    const reading = await measureWhile(
      'scans are read',
      { ...asked, rounds: ROUNDS.reading },
      async () => (await waiting()) > 0,
    );
    const seconds = Math.round((performance.now() - began) / 1000);
    print(idle, reading, `${SCANS - (await waiting())} of ${SCANS} scans read in ${seconds} s`);
  } finally {
    end();
    await Promise.all(processes.map((one) => one.exitCode ?? once(one, 'exit')));
    await Promise.all([app.pool.end(), owner.pool.end()]);
    await database.drop();
  }
}

function print(idle: Measured, reading: Measured, says: string): void {
  for (const { name, p50, p95, p99, perSecond } of [idle, reading])
    console.log(`${name.padEnd(20)} p50 ${p50} ms, p95 ${p95} ms, p99 ${p99} ms, ${perSecond} req/s`);
  const load = loadavg()
    .map((one) => one.toFixed(1))
    .join(' ');
  console.log(`p99 ${(reading.p99 / idle.p99).toFixed(2)} × idle; ${says}; load average ${load}`);
}

await main();
