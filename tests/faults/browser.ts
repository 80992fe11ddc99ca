import { encode } from 'next-auth/jwt';
import { expect, vi } from 'vitest';

import { env } from '@/lib/env';

import { DOOR } from './addresses';

const COOKIE = 'authjs.session-token';
const UNAVAILABLE = 503;

interface Asked {
  path: string;
  cookie: string;
  /** The same for every try, as the browser sends it. */
  key: string;
  body: object;
}

interface Answer {
  status: number;
  body: unknown;
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

/** What a browser does after a lost answer: the same call with the same key, until there is one. */
export const untilAnswered = (asked: Asked): Promise<Answer> =>
  vi.waitFor(
    async () => {
      const answer = await tryOnce(asked);
      if (answer === null || answer.status === UNAVAILABLE)
        throw new Error(`${asked.path} was never answered`);
      return answer;
    },
    { timeout: 300_000, interval: 25 },
  );

/** The same call once more after it was answered, as a person who did not trust it would; the answer is the same. */
export async function andAgain(asked: Asked, answered: Answer): Promise<void> {
  expect(await untilAnswered(asked)).toEqual(answered);
}

/** One try; null where the answer was lost with the process. */
async function tryOnce({ path, cookie, key, body }: Asked): Promise<Answer | null> {
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

/** One read; gives back its status. */
export async function readOnce(path: string, cookie: string): Promise<number> {
  const response = await fetch(`${DOOR}/api${path}`, { headers: { cookie } });
  await response.arrayBuffer();
  return response.status;
}
