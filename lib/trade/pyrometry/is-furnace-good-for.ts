import type { Table } from '../table';
import type { Grounds, Verdict } from '../verdict';

import { furnaceClass, type FurnaceClass, type FurnaceClassRow } from './furnace-class';
import type { InstrumentationType } from './instrumentation';
import { isDay, nextDue, type Interval } from './next-due';
import { testIntervals, type TestIntervalRow } from './test-intervals';

export interface Furnace {
  readonly class: FurnaceClass;
  readonly type: InstrumentationType;
  /** Whether it has earned the longer intervals. */
  readonly extended: boolean;
}

/** A uniformity survey or a system accuracy test that was made. */
export interface FurnaceTest {
  readonly kind: 'survey' | 'accuracy_test';
  /** `YYYY-MM-DD` */
  readonly on: string;
  readonly passed: boolean;
  /** The temperatures it covers; an accuracy test at one temperature has both alike. */
  readonly fromC: number;
  readonly toC: number;
}

export interface Cycle {
  /** The temperatures of the cycle, lowest and highest, °C. */
  readonly fromC: number;
  readonly toC: number;
  /** The loosest class that the specification allows for it. */
  readonly class: FurnaceClass;
}

export type FurnaceFault =
  | 'class_too_loose'
  | 'never_surveyed'
  | 'survey_failed'
  | 'survey_overdue'
  | 'outside_surveyed_range'
  | 'never_accuracy_tested'
  | 'accuracy_test_failed'
  | 'accuracy_test_overdue';

export interface FurnaceFinding extends Grounds {
  readonly fault: FurnaceFault;
  /** The last day on which the test was in time, where it is overdue. */
  readonly dueOn?: string;
}

/**
 * Whether a furnace is good for a cycle on a day: its class is tight enough, and its last survey and accuracy test
 * before that day passed, are still in time, and the survey covers the cycle's temperatures.
 *
 * @param on the day of the cycle, `YYYY-MM-DD`. Tests made after it do not count; the day a test is due is in time.
 * @param tests all that is known of the furnace, in any order.
 * @returns good, or every fault found; `goodUntil` is the first of the two days due, null where there is a fault.
 *   Refused as `not_a_date`, `range_reversed`, or where the tables have no row for the furnace.
 * @example class 5 type B for 843 °C: a survey of 2026-01-31 over 800 to 900 °C is in time until 2026-04-30.
 */
export function isFurnaceGoodFor(
  tables: { classes: Table<FurnaceClassRow>; intervals: Table<TestIntervalRow> },
  {
    furnace,
    cycle,
    on,
    tests,
  }: { furnace: Furnace; cycle: Cycle; on: string; tests: readonly FurnaceTest[] },
): Verdict<
  { good: boolean; goodUntil: string | null; findings: FurnaceFinding[] },
  'not_a_date' | 'range_reversed' | 'class_not_in_table' | 'class_and_type_not_in_table'
> {
  if (![on, ...tests.map((test) => test.on)].every(isDay)) return { ok: false, reason: 'not_a_date' };
  if (!(cycle.fromC <= cycle.toC) || tests.some(({ fromC, toC }) => !(fromC <= toC)))
    return { ok: false, reason: 'range_reversed' };
  const has = furnaceClass(tables.classes, furnace.class);
  const asked = furnaceClass(tables.classes, cycle.class);
  if (!has.ok) return has;
  if (!asked.ok) return asked;
  const intervals = testIntervals(tables.intervals, furnace);
  if (!intervals.ok) return intervals;

  const grounds = groundsOf(intervals);
  const surveys = tests.filter(({ kind }) => kind === 'survey');
  const covering = surveys.filter(({ fromC, toC }) => fromC <= cycle.fromC && cycle.toC <= toC);
  const survey = judge(covering, on, intervals.survey, SURVEY_FAULTS);
  const accuracyTests = tests.filter(({ kind }) => kind === 'accuracy_test');
  const accuracy = judge(accuracyTests, on, intervals.accuracyTest, ACCURACY_FAULTS);
  const elsewhere = survey.fault === 'never_surveyed' && lastBefore(surveys, on) !== undefined;

  const faults: { fault: FurnaceFault; dueOn?: string }[] = [];
  if (has.toleranceC > asked.toleranceC) faults.push({ fault: 'class_too_loose' });
  if (survey.fault) faults.push({ ...survey, fault: elsewhere ? 'outside_surveyed_range' : survey.fault });
  if (accuracy.fault) faults.push({ ...accuracy, fault: accuracy.fault });
  const [firstDue] = [survey.dueOn, accuracy.dueOn].flatMap((day) => day ?? []).toSorted();
  const good = faults.length === 0;
  return {
    ok: true,
    good,
    goodUntil: (good && firstDue) || null,
    findings: faults.map(({ fault, dueOn }) => ({
      fault,
      ...(fault.endsWith('overdue') && dueOn !== undefined && { dueOn }),
      ...(fault === 'class_too_loose' ? groundsOf(has) : grounds),
    })),
    ...grounds,
  };
}

interface Faults {
  never: FurnaceFault;
  failed: FurnaceFault;
  overdue: FurnaceFault;
}

const SURVEY_FAULTS: Faults = {
  never: 'never_surveyed',
  failed: 'survey_failed',
  overdue: 'survey_overdue',
};
const ACCURACY_FAULTS: Faults = {
  never: 'never_accuracy_tested',
  failed: 'accuracy_test_failed',
  overdue: 'accuracy_test_overdue',
};

/** The last test up to a day decides; an earlier one that passed does not outlive a later one that failed. */
function judge(
  tests: readonly FurnaceTest[],
  on: string,
  interval: Interval,
  faults: Faults,
): { fault?: FurnaceFault; dueOn?: string } {
  const last = lastBefore(tests, on);
  if (!last) return { fault: faults.never };
  if (!last.passed) return { fault: faults.failed };
  const due = nextDue(last.on, interval);
  if (!due.ok) return { fault: faults.never };
  return due.dueOn < on ? { fault: faults.overdue, dueOn: due.dueOn } : { dueOn: due.dueOn };
}

const lastBefore = (tests: readonly FurnaceTest[], on: string): FurnaceTest | undefined =>
  // Of two on one day the later in the list is the repetition.
  tests
    .filter((test) => test.on <= on)
    .toSorted((one, other) => one.on.localeCompare(other.on))
    .at(-1);

const groundsOf = ({ source, readFrom }: Grounds): Grounds => ({ source, ...(readFrom && { readFrom }) });
