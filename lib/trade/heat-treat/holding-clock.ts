import type { Alloy } from '../alloys/alloy';
import { referenceTo, type Table } from '../table';
import type { HoldingRow } from '../tables/holding-limits';
import { celsiusFromFahrenheit } from '../units/temperature';
import type { Verdict } from '../verdict';

const MS_PER_MIN = 60_000;
const MIN_PER_DAY = 1440;

/** Time in the cold: without an end it is there still. */
export interface ColdStay {
  readonly putInAt: Date;
  readonly takenOutAt?: Date;
  readonly temperatureC: number;
}

export interface HoldingClock {
  readonly where: 'at_room_temperature' | 'in_the_cold';
  /** Since when it is there. */
  readonly since: Date;
  /** Until then it keeps; after it, it has to be treated again or aged as it is. */
  readonly endsAt: Date;
  readonly roomLimitMin: number;
  /** Spent outside the cold so far, up to where it was last put in or taken out. */
  readonly roomUsedMin: number;
  /** Null while it has never been in the cold. */
  readonly coldLimitMin: number | null;
  readonly coldUsedMin: number;
}

export type HoldingRefusal =
  | 'alloy_not_in_table'
  | 'not_cold_enough'
  | 'times_out_of_order'
  /** It lay too long before it was put in, in all its times outside together, or in the cold. */
  | 'room_time_exceeded'
  | 'cold_time_exceeded';

/**
 * How long a part that is quenched and not aged keeps soft, and until when.
 *
 * Time at room temperature adds up over all its times outside; time in the cold adds up too and is held against the
 * limit of the warmest store that it was in. No clock is asked: everything follows from the times given.
 *
 * @param part when it was quenched, and its stays in the cold in order; only the last may be without an end. °C.
 * @example holdingClock(HOLDING_LIMITS, {alloy: '2024', quenchedAt: 9:00, stays: []}) ends at 9:15;
 *   put in at 9:10 at -20 °C it ends 30 days after that; taken out, 5 min after that
 */
export function holdingClock(
  table: Table<HoldingRow>,
  part: { readonly alloy: Alloy; readonly quenchedAt: Date; readonly stays: readonly ColdStay[] },
): Verdict<HoldingClock, HoldingRefusal> {
  const row = table.rows.find(({ alloys }) => alloys.includes(part.alloy));
  if (!row) return { ok: false, reason: 'alloy_not_in_table' };
  const refuse = (reason: HoldingRefusal) => ({ ok: false, reason, source: row.source }) as const;
  if (!isInOrder(part.quenchedAt, part.stays)) return refuse('times_out_of_order');
  const coldLimitMin = coldLimitOf(row, part.stays);
  if (coldLimitMin === undefined) return refuse('not_cold_enough');

  const { roomUsedMin, coldUsedMin, last } = addUp(part.quenchedAt, part.stays);
  if (roomUsedMin > row.roomMin) return refuse('room_time_exceeded');
  if (coldLimitMin !== null && coldUsedMin > coldLimitMin) return refuse('cold_time_exceeded');
  const isCold = last.isCold && coldLimitMin !== null;
  const leftMin = isCold ? coldLimitMin - coldUsedMin : row.roomMin - roomUsedMin;
  return {
    ok: true,
    where: isCold ? 'in_the_cold' : 'at_room_temperature',
    since: last.since,
    endsAt: new Date(last.since.getTime() + leftMin * MS_PER_MIN),
    roomLimitMin: row.roomMin,
    roomUsedMin,
    coldLimitMin,
    coldUsedMin,
    source: row.source,
    readFrom: referenceTo(table),
  };
}

function isInOrder(quenchedAt: Date, stays: readonly ColdStay[]): boolean {
  const times = [quenchedAt, ...stays.flatMap(({ putInAt, takenOutAt }) => [putInAt, takenOutAt])];
  const given = times.filter((time) => time !== undefined).map((time) => time.getTime());
  const openBeforeEnd = stays.slice(0, -1).some(({ takenOutAt }) => takenOutAt === undefined);
  return !openBeforeEnd && given.every((time, index) => time >= (given[index - 1] ?? time));
}

/** Null without a stay; undefined where a store is warmer than the table goes. */
function coldLimitOf(row: HoldingRow, stays: readonly ColdStay[]): number | null | undefined {
  if (stays.length === 0) return null;
  const warmest = Math.max(...stays.map(({ temperatureC }) => temperatureC));
  const limit = row.cold.findLast(({ atF }) => warmest <= celsiusFromFahrenheit(atF) + 1e-9);
  return limit && limit.days * MIN_PER_DAY;
}

function addUp(quenchedAt: Date, stays: readonly ColdStay[]) {
  let last = { since: quenchedAt, isCold: false };
  let roomUsedMin = 0;
  let coldUsedMin = 0;
  for (const { putInAt, takenOutAt } of stays) {
    roomUsedMin += (putInAt.getTime() - last.since.getTime()) / MS_PER_MIN;
    last = { since: putInAt, isCold: true };
    if (takenOutAt) {
      coldUsedMin += (takenOutAt.getTime() - putInAt.getTime()) / MS_PER_MIN;
      last = { since: takenOutAt, isCold: false };
    }
  }
  return { roomUsedMin, coldUsedMin, last };
}
