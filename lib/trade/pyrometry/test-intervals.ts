import { referenceTo, type Table } from '../table';
import type { Verdict } from '../verdict';

import type { FurnaceClass } from './furnace-class';
import type { InstrumentationType } from './instrumentation';
import type { Interval } from './next-due';

/** Intervals of parts furnaces: accuracy tests (SAT) and uniformity surveys (TUS), before and after extension. */
export interface TestIntervalRow {
  readonly classes: readonly FurnaceClass[];
  readonly types: readonly InstrumentationType[];
  readonly accuracyTest: Interval;
  readonly accuracyTestExtended: Interval;
  readonly survey: Interval;
  readonly surveyExtended: Interval;
}

/**
 * How often a furnace's accuracy test and uniformity survey are due.
 *
 * @param furnace `extended` says that the furnace has earned the longer intervals (successful tests in a row).
 * @returns refused as `class_and_type_not_in_table`: the table has no row for type D+, and class 6 only with type E.
 * @example class 5, type B: accuracy test monthly, survey quarterly; extended quarterly and semiannual.
 */
export function testIntervals(
  table: Table<TestIntervalRow>,
  furnace: { class: FurnaceClass; type: InstrumentationType; extended: boolean },
): Verdict<{ accuracyTest: Interval; survey: Interval }, 'class_and_type_not_in_table'> {
  const row = table.rows.find(
    ({ classes, types }) => classes.includes(furnace.class) && types.includes(furnace.type),
  );
  if (!row) return { ok: false, reason: 'class_and_type_not_in_table' };
  return {
    ok: true,
    accuracyTest: furnace.extended ? row.accuracyTestExtended : row.accuracyTest,
    survey: furnace.extended ? row.surveyExtended : row.survey,
    source: row.source,
    readFrom: referenceTo(table),
  };
}
