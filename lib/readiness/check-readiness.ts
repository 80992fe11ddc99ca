import { sql } from 'drizzle-orm';

import type { Db } from '@/db/client';
import { log } from '@/lib/log';
import { checkMail } from '@/lib/mail/send-mail';
import { checkStorage } from '@/lib/storage/object-store';

export interface Readiness {
  ready: boolean;
  checks: { name: string; ok: boolean; ms: number }[];
}

/** Slower than this counts as down: whoever asks will not wait longer. */
const PATIENCE_MS = 3000;

/** All that the web server needs, asked at once. Why something is down stands in the log, not in the answer. */
export async function checkReadiness(primary: Db, replica: Db): Promise<Readiness> {
  const asked: [string, () => Promise<unknown>][] = [
    ['database', () => primary.execute(sql`select 1`)],
    ...(replica === primary
      ? []
      : [['replica', () => replica.execute(sql`select 1`)] as [string, () => Promise<unknown>]]),
    ['storage', () => checkStorage()],
    ['mail', () => checkMail()],
    ['queue', () => primary.execute(sql`select version from pgboss.version`)],
  ];
  const checks = await Promise.all(asked.map(([name, ask]) => check(name, ask)));
  return { ready: checks.every(({ ok }) => ok), checks };
}

async function check(name: string, ask: () => Promise<unknown>): Promise<Readiness['checks'][number]> {
  const startedAt = performance.now();
  const ms = () => Math.round(performance.now() - startedAt);
  let timer: NodeJS.Timeout | undefined;
  const tooLong = new Promise<never>((_, refuse) => {
    timer = setTimeout(() => refuse(new Error(`no answer in ${PATIENCE_MS} ms`)), PATIENCE_MS);
  });
  try {
    await Promise.race([ask(), tooLong]);
    return { name, ok: true, ms: ms() };
  } catch (error) {
    log.warn({ error, check: name }, 'not ready');
    return { name, ok: false, ms: ms() };
  } finally {
    clearTimeout(timer);
  }
}
