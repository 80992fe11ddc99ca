import { referenceTo, type Table } from '../table';
import type { TemperRow } from '../tables/tempers';
import { minFromHours } from '../units/time';
import type { Verdict } from '../verdict';
import type { Temper } from './temper';

/** A temper as a drawing states it, and the time since the quench where one is stated with W. */
export interface StatedTemper {
  readonly temper: Temper;
  readonly agedMin?: number;
}

/**
 * Reads a temper as it is written: `T3`, `-T6`, `t 62`, `T736` (today T74), `W (1/2 hour)`.
 *
 * @returns the temper's present designation and, for W, the natural ageing in minutes where it is stated; refused as
 *   `unknown_temper` when the table has no such name.
 * @example readTemper(TEMPER_DESIGNATIONS, 'W (1/2 hour)') is {temper: 'W', agedMin: 30}
 */
export function readTemper(
  table: Table<TemperRow>,
  written: string,
): Verdict<{ readonly stated: StatedTemper }, 'unknown_temper'> {
  const [, name, time] = /^[\s-]*([A-Z]+\d*|T \d+|0)\s*(\(?\s*[\d./]+\s*[a-z]+\s*\)?)?$/i.exec(written) ?? [];
  const designation = name?.replace(' ', '').toUpperCase();
  const row = table.rows.find(
    ({ temper, alsoWritten }) =>
      designation !== undefined && (temper === designation || alsoWritten?.includes(designation)),
  );
  const agedMin = time === undefined ? undefined : readTime(time);
  if (!row || (time !== undefined && (agedMin === undefined || !row.statesTime)))
    return { ok: false, reason: 'unknown_temper' };
  return {
    ok: true,
    stated: { temper: row.temper, ...(agedMin === undefined ? {} : { agedMin }) },
    source: row.source,
    readFrom: referenceTo(table),
  };
}

function readTime(written: string): number | undefined {
  const [, above, below = '1', unit] = /([\d.]+)(?:\/(\d+))?\s*([a-z]+)/i.exec(written) ?? [];
  const value = Number(above) / Number(below);
  if (!Number.isFinite(value) || unit === undefined) return undefined;
  if (/^(?:h|hr|hrs|hour|hours)$/i.test(unit)) return minFromHours(value);
  return /^(?:min|mins|minute|minutes)$/i.test(unit) ? value : undefined;
}
