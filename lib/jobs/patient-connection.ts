import { setTimeout as pause } from 'node:timers/promises';

import { connect } from '@/db/client';
import { log } from '@/lib/log';

const PATIENCE_MS = 120_000;
const LONGEST_PAUSE_MS = 2_000;
/** What is said when the server is restarting, or its machine is: the same statement works a moment later. */
const AWAY = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'EPIPE',
  'ETIMEDOUT',
  '57P01',
  '57P02',
  '57P03',
  '08006',
  '08003',
]);
const AWAY_WORDS = /connection terminated|timeout exceeded when trying to connect|connection timeout/i;

interface Answer {
  rows: unknown[];
}

/**
 * The queue's connection, which waits for a database that is away instead of failing.
 *
 * The queue reports the end of a job without looking whether the report arrived: a failure there would end the whole
 * process, and the job would be run again minutes later although it was done.
 */
export function patientConnection(url: string, max: number) {
  const { pool } = connect(url, max);
  return {
    async executeSql(text: string, values: unknown[]): Promise<Answer> {
      const giveUpAt = Date.now() + PATIENCE_MS;
      for (let pauseMs = 100; ; pauseMs = Math.min(pauseMs * 2, LONGEST_PAUSE_MS)) {
        try {
          return await pool.query(text, values);
        } catch (error) {
          if (!isAway(error) || Date.now() > giveUpAt) throw error;
          log.warn({ error }, 'the database is away; waiting for it');
          await pause(pauseMs);
        }
      }
    },
    close: () => pool.end(),
  };
}

function isAway(error: unknown): boolean {
  if (!(error instanceof Error)) return false;
  const { code } = error as NodeJS.ErrnoException;
  return (code !== undefined && AWAY.has(code)) || AWAY_WORDS.test(error.message);
}
