import { env } from '@/lib/env';

import { connect, type Db } from './client';

// `next dev` loads modules anew with every change; the pools stay.
const kept = globalThis as typeof globalThis & { lotwrightDb?: Db; lotwrightReplica?: Db };

/** The database that takes writes. */
export const primary = (): Db => (kept.lotwrightDb ??= connect(env.DATABASE_URL).db);

/** For reads that may be a moment old; the primary where there is no replica. */
export const replica = (): Db =>
  (kept.lotwrightReplica ??=
    env.DATABASE_REPLICA_URL === undefined ? primary() : connect(env.DATABASE_REPLICA_URL).db);
