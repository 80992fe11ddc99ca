import { join } from 'node:path';
import { Client } from 'pg';
import type { TestProject } from 'vitest/node';
import { type Cluster, createDatabase, dropDatabase, openCluster } from '@/db/cluster';
import { standIns } from '@/lib/stack/parts';
import { prepareDatabase } from '@/lib/stack/prepare-database';
import { answers, type RunningPart, startPart } from '@/lib/stack/running-part';
import { stackSettings } from '@/lib/stack/settings';

declare module 'vitest' {
  interface ProvidedContext {
    superUrl: string;
    template: string;
  }
}

/**
 * A cluster, the stand-ins and one migrated database that each test file copies.
 *
 * What is already running is used and left alone, so that single files can be run beside a whole run.
 */
export default async function setUp(project: TestProject): Promise<() => Promise<void>> {
  const root = process.cwd();
  const settings = stackSettings('test', process.env, root);
  const cluster: Cluster = await openCluster({
    folder: settings.clusterFolder,
    port: settings.ports.database,
    throwAway: true,
    report: console.log,
  });
  const template = `template_${process.pid}_${Date.now()}`;
  await createDatabase(cluster.superUrl, template);
  await prepareDatabase(databaseUrl(cluster.superUrl, { role: 'lotwright_owner', database: template }));
  await disconnectEverybody(cluster.superUrl, template);

  const started: RunningPart[] = [];
  for (const part of standIns(settings)) {
    if (await answers(part.health)) continue;
    const running = startPart(part, {
      env: settings.env,
      logFile: join(settings.dataFolder, 'logs', `${part.name}.log`),
    });
    started.push(running);
    await running.isUp(30_000);
  }

  project.provide('superUrl', cluster.superUrl);
  project.provide('template', template);
  return async () => {
    await Promise.all(started.map((part) => part.stop()));
    await dropDatabase(cluster.superUrl, template);
    await cluster.stop();
  };
}

function databaseUrl(superUrl: string, { role, database }: { role: string; database: string }): string {
  const url = new URL(superUrl);
  url.username = role;
  url.pathname = `/${database}`;
  return url.href;
}

/** A database with a connection cannot be copied, and a pool takes a moment to let go. */
async function disconnectEverybody(superUrl: string, database: string): Promise<void> {
  const client = new Client({ connectionString: superUrl });
  await client.connect();
  await client.query('select pg_terminate_backend(pid) from pg_stat_activity where datname = $1', [database]);
  await client.end();
}
