import { referenceTo, type Table } from '../table';
import type { Verdict } from '../verdict';

export const INSTRUMENTATION_TYPES = ['A', 'B', 'C', 'D+', 'D', 'E'] as const;
export type InstrumentationType = (typeof INSTRUMENTATION_TYPES)[number];

/** What a furnace of an instrumentation type has, zone by zone. */
export interface InstrumentationRow {
  readonly type: InstrumentationType;
  readonly controlPerZone: boolean;
  readonly recordsControl: boolean;
  readonly recordsHottestAndColdest: boolean;
  readonly loadSensor: boolean;
  /** A second recording sensor away from the control sensor, in millimetres at least; null where none is asked. */
  readonly extraRecordingAtLeastMm: number | null;
  /** Over-temperature protection with a sensor of its own. */
  readonly overTemperature: boolean;
}

/**
 * What an instrumentation type asks of a furnace.
 *
 * @returns the row of the table; refused as `type_not_in_table`.
 * @example type B: control, recording of the control sensor and a load sensor; hottest and coldest place not recorded.
 */
export function instrumentation(
  table: Table<InstrumentationRow>,
  type: InstrumentationType,
): Verdict<{ asks: InstrumentationRow }, 'type_not_in_table'> {
  const row = table.rows.find((one) => one.type === type);
  if (!row) return { ok: false, reason: 'type_not_in_table' };
  const { source, ...asks } = row;
  return { ok: true, asks, source, readFrom: referenceTo(table) };
}
