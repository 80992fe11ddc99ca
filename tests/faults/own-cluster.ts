import { readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { expect, vi } from 'vitest';

import { openCluster } from '@/db/cluster';
import { prepareDatabase } from '@/lib/stack/prepare-database';
import { stackSettings } from '@/lib/stack/settings';

import { DATABASE_PORT } from './addresses';

export interface OwnCluster {
  appUrl: string;
  ownerUrl: string;
  /** `fast` ends what is going on and stops in order; `immediate` just stops, and recovers when it starts again. */
  restart(how: 'fast' | 'immediate'): Promise<void>;
  close(): Promise<void>;
}

const SIGNAL = { fast: 'SIGINT', immediate: 'SIGQUIT' } as const;

/** A database server that nobody else uses, migrated and empty. */
export async function openOwnCluster(): Promise<OwnCluster> {
  const { dataFolder } = stackSettings('test', process.env, process.cwd());
  const place = { folder: join(dataFolder, 'faults', 'pg'), port: DATABASE_PORT, report: () => undefined };
  const cluster = await openCluster({ ...place, throwAway: true });
  const urlOf = (role: string) => `postgresql://${role}@127.0.0.1:${DATABASE_PORT}/lotwright`;
  const ownerUrl = urlOf('lotwright_owner');
  await prepareDatabase(ownerUrl);

  const restart = async (how: keyof typeof SIGNAL): Promise<void> => {
    const pidFile = join(dirname(cluster.logFile), 'postmaster.pid');
    process.kill(Number(readFileSync(pidFile, 'utf8').split('\n')[0]), SIGNAL[how]);
    await vi.waitFor(() => expect(cluster.isRunning()).toBe(false), { timeout: 60_000 });
    await openCluster({ ...place, throwAway: false });
  };
  // What throws away may also lose what it answered; from here on it is a server like anybody's.
  await restart('fast');
  return { appUrl: urlOf('lotwright_app'), ownerUrl, restart, close: () => cluster.stop() };
}
