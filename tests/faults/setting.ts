import { encode } from 'next-auth/jwt';
import { afterAll, beforeAll } from 'vitest';

import { connect, type Db } from '@/db/client';
import { env } from '@/lib/env';

import { makeDatabase } from '../services/database';
import { bundle, Killable } from './killable';

const DOOR_PORT = 5701;
const DOOR = `http://127.0.0.1:${DOOR_PORT}`;
const COOKIE = 'authjs.session-token';

export interface Setting {
  db: Db;
  owner: Db;
  door: Killable;
}

/** A database, and a door to be killed. */
export function openSetting(): Setting {
  const setting = {} as Setting;
  let close = () => Promise.resolve();
  beforeAll(async () => {
    const database = await makeDatabase();
    const [app, owner] = [connect(database.appUrl), connect(database.ownerUrl, 4)];
    const settings = {
      DATABASE_URL: database.appUrl,
      DATABASE_OWNER_URL: database.ownerUrl,
      APP_URL: DOOR,
      LOG_LEVEL: 'silent',
      NODE_ENV: 'production',
    };
    const door = new Killable(
      await bundle('tests/faults/door.ts', 'door'),
      [String(DOOR_PORT)],
      settings,
      `${DOOR}/api/health`,
    );
    Object.assign(setting, { db: app.db, owner: owner.db, door });
    await door.start();
    close = async () => {
      await door.kill();
      await Promise.all([app.pool.end(), owner.pool.end()]);
      await database.drop();
    };
  });
  afterAll(() => close());
  return setting;
}

/** The cookie that the browser of a person of the shop would send. */
export async function cookieOf(userId: string, shopId: string): Promise<string> {
  const token = await encode({
    token: { claims: { kind: 'person', userId, sessionVersion: 1, shopId } },
    secret: env.AUTH_SECRET,
    salt: COOKIE,
  });
  return `${COOKIE}=${token}`;
}

interface Asked {
  path: string;
  cookie: string;
  /** The same for every try, as the browser sends it. */
  key: string;
  body: object;
}

/** One try; null where the answer was lost with the process. */
export async function tryOnce({
  path,
  cookie,
  key,
  body,
}: Asked): Promise<{ status: number; body: unknown } | null> {
  try {
    const response = await fetch(`${DOOR}/api${path}`, {
      method: 'POST',
      headers: { cookie, 'content-type': 'application/json', 'idempotency-key': key },
      body: JSON.stringify(body),
    });
    return { status: response.status, body: await response.json() };
  } catch {
    return null;
  }
}

/** What a browser does after a lost answer: the same call with the same key, until there is one. */
export async function tryUntilAnswered(
  setting: Setting,
  asked: Asked,
): Promise<{ status: number; body: unknown }> {
  for (let tries = 0; tries < 5; tries++) {
    await setting.door.kill();
    await setting.door.start();
    const answered = await tryOnce(asked);
    if (answered && answered.status !== 503) return answered;
  }
  throw new Error(`${asked.path} was never answered`);
}
