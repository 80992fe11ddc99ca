import { HOLDING_LIMITS } from '@/lib/trade/tables/holding-limits';

import type { Bench } from './use-bench';

/** `zone`: minutes east of UTC in which the times are said; empty until one is. */
export const HOLDING_FIELDS = {
  alloy: { kind: 'word', first: '2024' },
  store: { kind: 'temperature', first: '0' },
  quenched: { kind: 'word', first: '' },
  putIn: { kind: 'word', first: '' },
  takenOut: { kind: 'word', first: '' },
  zone: { kind: 'word', first: '' },
} as const;
export type HoldingField = 'quenched' | 'putIn' | 'takenOut';
export type HoldingBench = Bench<keyof typeof HOLDING_FIELDS>;

/** The alloys that the table has a holding time of. */
export const HELD = HOLDING_LIMITS.rows.flatMap(({ alloys }) => alloys);

/** The widest that any clock on earth stands from UTC, in minutes. */
const WIDEST_MIN = 14 * 60;

/** The zone of an address; null where it has none: then the times are those of the clock on the reader's wall. */
export function readZone(typed: string): number | null {
  const zone = /^-?\d{1,3}$/.test(typed) ? Number(typed) : NaN;
  return Math.abs(zone) <= WIDEST_MIN ? zone : null;
}
