import { createHash } from 'node:crypto';
import { lt, sql, type SQL } from 'drizzle-orm';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';

import { withTenant, type Db, type Tx } from '@/db/client';
import { throttles } from '@/db/schema/people';
import { AppError } from '@/lib/errors';

/**
 * How many tries there are, in how many seconds. By account against guessing one person's password, by address against
 * trying one password on everybody; an address may be a whole shop behind one router, so it gets more.
 */
const LIMITS = {
  sign_in: { account: [8, 15 * 60], address: [80, 15 * 60] },
  mail: { account: [5, 60 * 60], address: [40, 60 * 60] },
} as const;

export type Throttled = keyof typeof LIMITS;

interface Trier {
  /** The e-mail as typed; whether there is such an account makes no difference. */
  email: string;
  address: string;
}

/**
 * Takes one try from the account and one from the address.
 *
 * @throws AppError `too_many`, saying how long to wait.
 */
export async function takeTry(db: Db | Tx, what: Throttled, { email, address }: Trier): Promise<void> {
  const waits = [
    await waitOf(limiter(db, what, 'account'), email),
    await waitOf(limiter(db, what, 'address'), address),
  ];
  const longest = Math.max(...waits);
  if (longest > 0) throw tooMany(what, longest);
}

/** Takes one; how long to wait where none was left. */
async function waitOf(limit: RateLimiterPostgres, whose: string): Promise<number> {
  try {
    await limit.consume(keyOf(whose));
    return 0;
  } catch (reason) {
    if (reason instanceof RateLimiterRes) return Math.max(reason.msBeforeNext, 1000);
    throw reason;
  }
}

/** After a right password: the account starts anew, the address gets its try back. */
export async function giveBackTry(db: Db | Tx, what: Throttled, { email, address }: Trier): Promise<void> {
  await limiter(db, what, 'account').delete(keyOf(email));
  await limiter(db, what, 'address').reward(keyOf(address));
  if (!('rollback' in db))
    await withTenant(db, { kind: 'door' }, (tx) =>
      tx.delete(throttles).where(lt(throttles.expire, Date.now())),
    );
}

function tooMany(what: Throttled, waitMs: number): AppError {
  const waitS = Math.ceil(waitMs / 1000);
  const says =
    what === 'sign_in' ? 'That was too many tries to sign in.' : 'That was too many mails in one hour.';
  return new AppError('too_many', `${says} Wait ${waitWords(waitS)}, then try again.`, { extra: { waitS } });
}

/** Rounded up, so that nobody comes back too early. */
export const waitWords = (seconds: number): string =>
  seconds < 60 ? `${seconds} s` : `${Math.ceil(seconds / 60)} min`;

function limiter(db: Db | Tx, what: Throttled, by: 'account' | 'address'): RateLimiterPostgres {
  const [points, duration] = LIMITS[what][by];
  return new RateLimiterPostgres({
    storeClient: { query: (asked: Statement) => query(db, asked) },
    storeType: 'client',
    tableName: 'throttles',
    tableCreated: true,
    clearExpiredByTimeout: false,
    keyPrefix: `${what}:${by}`,
    points,
    duration,
  });
}

interface Statement {
  text: string;
  values: readonly unknown[];
}

/** Each in a transaction at the door, or in the one given. */
async function query(
  db: Db | Tx,
  { text, values }: Statement,
): Promise<{ rows: unknown[]; rowCount: number | null }> {
  const chunks: SQL[] = text
    .split(/\$(\d+)/)
    .map((chunk, at) => (at % 2 === 0 ? sql.raw(chunk) : sql`${values[Number(chunk) - 1]}`));
  const statement = sql.join(chunks);
  return 'rollback' in db
    ? db.execute(statement)
    : withTenant(db, { kind: 'door' }, (tx) => tx.execute(statement));
}

const keyOf = (text: string): string =>
  createHash('sha256').update(text.trim().toLowerCase()).digest('base64url');
