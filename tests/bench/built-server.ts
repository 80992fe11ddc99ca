import { spawn, type ChildProcess } from 'node:child_process';

import { encode } from 'next-auth/jwt';

import { createDatabase, dropDatabase } from '@/db/cluster';
import { env } from '@/lib/env';
import { prepareDatabase } from '@/lib/stack/prepare-database';

const COOKIE = 'authjs.session-token';

export interface OwnDatabase {
  appUrl: string;
  ownerUrl: string;
  drop(): Promise<void>;
}

/** A migrated, empty database beside the running stack's own. */
export async function makeOwnDatabase(name: string): Promise<OwnDatabase> {
  const superUrl = urlOf(env.DATABASE_OWNER_URL, 'postgres', 'postgres');
  await dropDatabase(superUrl, name);
  await createDatabase(superUrl, name);
  const ownerUrl = urlOf(env.DATABASE_OWNER_URL, null, name);
  await prepareDatabase(ownerUrl);
  return {
    ownerUrl,
    appUrl: urlOf(env.DATABASE_URL, null, name),
    drop: () => dropDatabase(superUrl, name).catch(() => undefined),
  };
}

/** The processes of the product at a database, as they run when it is built. */
export const startAt = (
  command: readonly string[],
  { appUrl, ownerUrl }: OwnDatabase,
  given: Record<string, string> = {},
): ChildProcess =>
  spawn(process.execPath, [...command], {
    env: {
      ...process.env,
      DATABASE_URL: appUrl,
      DATABASE_OWNER_URL: ownerUrl,
      NODE_ENV: 'production',
      LOG_LEVEL: 'warn',
      ...given,
    },
    stdio: ['ignore', 'ignore', 'inherit'],
  });

/** The built web server, up and answering at `base`. */
export async function startWeb(database: OwnDatabase, base: string): Promise<ChildProcess> {
  const { port } = new URL(base);
  const server = startAt(['node_modules/next/dist/bin/next', 'start', '-p', port], database, {
    APP_URL: base,
  });
  for (let tries = 0; tries < 120; tries++) {
    const response = await fetch(`${base}/api/health`).catch(() => null);
    if (response?.ok) return server;
    await new Promise((resolve) => setTimeout(resolve, 250));
  }
  server.kill('SIGTERM');
  throw new Error('The web server did not come up. Is it built? Run npm start once.');
}

/** The headers of somebody who is signed in. */
export async function signedIn({ userId, shopId }: { userId: string; shopId: string }) {
  const token = await encode({
    token: { claims: { kind: 'person', userId, sessionVersion: 1, shopId } },
    secret: env.AUTH_SECRET,
    salt: COOKIE,
  });
  return { cookie: `${COOKIE}=${token}` };
}

function urlOf(given: string, user: string | null, database: string): string {
  const url = new URL(given);
  if (user !== null) url.username = user;
  url.pathname = `/${database}`;
  return url.href;
}
