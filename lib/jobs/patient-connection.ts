import { setTimeout as pause } from 'node:timers/promises';

import { connect } from '@/db/client';
import { isAway } from '@/db/is-away';
import { log } from '@/lib/log';

const LONGEST_PAUSE_MS = 2_000;

interface Answer {
  rows: unknown[];
}

/**
 * The queue's connection, which waits for a database that is away instead of failing.
 *
 * The queue reports the end of a job without looking whether the report arrived: a failure there would end the whole
 * process, and the job would be run again minutes later although it was done. So it waits as long as it takes, until it
 * is closed.
 */
export function patientConnection(url: string, max: number) {
  const { pool } = connect(url, max);
  let isClosed = false;
  return {
    async executeSql(text: string, values: unknown[]): Promise<Answer> {
      for (let pauseMs = 100; ; pauseMs = Math.min(pauseMs * 2, LONGEST_PAUSE_MS)) {
        try {
          return await pool.query(text, values);
        } catch (error) {
          if (!isAway(error) || isClosed) throw error;
          log.warn({ error }, 'the database is away; waiting for it');
          await pause(pauseMs);
        }
      }
    },
    close: () => {
      isClosed = true;
      return pool.end();
    },
  };
}
