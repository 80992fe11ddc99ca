import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { classNeeded, HEATED_WORK } from '@/lib/trade/pyrometry/class-needed';
import { FURNACE_CLASSES, furnaceClass, loosestClassWithin } from '@/lib/trade/pyrometry/furnace-class';
import { instrumentation, INSTRUMENTATION_TYPES } from '@/lib/trade/pyrometry/instrumentation';
import {
  isFurnaceGoodFor,
  type Cycle,
  type Furnace,
  type FurnaceTest,
} from '@/lib/trade/pyrometry/is-furnace-good-for';
import { INTERVALS, nextDue } from '@/lib/trade/pyrometry/next-due';
import { surveyLocations } from '@/lib/trade/pyrometry/survey-locations';
import { testIntervals } from '@/lib/trade/pyrometry/test-intervals';
import { FURNACE_UNIFORMITY } from '@/lib/trade/tables/furnace-classes';
import { FURNACE_CLASSES_NEEDED } from '@/lib/trade/tables/furnace-classes-needed';
import { FURNACE_INSTRUMENTATION } from '@/lib/trade/tables/furnace-instrumentation';
import { PYROMETRY_INTERVALS } from '@/lib/trade/tables/pyrometry-intervals';
import { SURVEY_LOCATIONS } from '@/lib/trade/tables/survey-locations';

import { numberOf, publishedRows, saidBy } from './values';

function oneOf<Known extends string | number>(known: readonly Known[], text: string): Known {
  const found = known.find((one) => String(one) === text);
  if (found === undefined) throw new Error(`"${text}" is none of ${known.join(', ')}`);
  return found;
}

describe('furnace classes', () => {
  const rows = publishedRows('pyrometry-classes', ['class', 'tolerance_F', 'tolerance_C']);
  test.each(rows.map((row) => [row.class, saidBy(row), row] as const))(
    'class %s (%s)',
    (_class, _said, row) => {
      const asked = oneOf(FURNACE_CLASSES, row.class);
      const [toleranceF, toleranceC] = [numberOf(row.tolerance_F), numberOf(row.tolerance_C)];
      expect(furnaceClass(FURNACE_UNIFORMITY, asked)).toMatchObject({ ok: true, toleranceF, toleranceC });
      expect(loosestClassWithin(FURNACE_UNIFORMITY, { tolerance: toleranceF, scale: 'F' })).toMatchObject({
        class: asked,
      });
      expect(loosestClassWithin(FURNACE_UNIFORMITY, { tolerance: toleranceC, scale: 'C' })).toMatchObject({
        class: asked,
      });
    },
  );

  test('the trap of converting the printed limit: ±10 °F is class 2 although 6 °C is more than 10 °F', () => {
    expect(loosestClassWithin(FURNACE_UNIFORMITY, { tolerance: 10, scale: 'F' })).toMatchObject({ class: 2 });
    expect(loosestClassWithin(FURNACE_UNIFORMITY, { tolerance: 10 / 1.8, scale: 'C' })).toMatchObject({
      class: 1,
    });
  });

  test('tighter than any class is refused', () => {
    expect(loosestClassWithin(FURNACE_UNIFORMITY, { tolerance: 4.9, scale: 'F' })).toEqual({
      ok: false,
      reason: 'tighter_than_table',
    });
    expect(loosestClassWithin(FURNACE_UNIFORMITY, { tolerance: 0, scale: 'C' })).toEqual({
      ok: false,
      reason: 'tolerance_not_positive',
    });
    expect(furnaceClass({ ...FURNACE_UNIFORMITY, rows: [] }, 1)).toEqual({
      ok: false,
      reason: 'class_not_in_table',
    });
  });

  const needed = publishedRows('pyrometry-class-needed', ['work', 'loosest', 'tightest', 'tolerance_F']);
  test.each(needed.map((row) => [row.work, saidBy(row), row] as const))('%s (%s)', (_work, _said, row) => {
    const answer = classNeeded(FURNACE_CLASSES_NEEDED, oneOf(HEATED_WORK, row.work));
    expect(answer).toMatchObject({ loosest: numberOf(row.loosest), tightest: numberOf(row.tightest) });
    expect(answer.ok && furnaceClass(FURNACE_UNIFORMITY, answer.loosest)).toMatchObject({
      toleranceF: numberOf(row.tolerance_F),
    });
  });
});

describe('instrumentation', () => {
  const COLUMNS = [
    'type',
    'control_per_zone',
    'recording_of_control',
    'hottest_and_coldest_recording',
    'load_sensor',
    'extra_recording_in',
    'overtemp_protection',
  ] as const;
  test.each(
    publishedRows('pyrometry-instrumentation', COLUMNS).map((row) => [row.type, saidBy(row), row] as const),
  )('type %s (%s)', (_type, _said, row) => {
    const answer = instrumentation(FURNACE_INSTRUMENTATION, oneOf(INSTRUMENTATION_TYPES, row.type));
    expect(answer).toMatchObject({
      ok: true,
      asks: {
        controlPerZone: row.control_per_zone === 'yes',
        recordsControl: row.recording_of_control === 'yes',
        recordsHottestAndColdest: row.hottest_and_coldest_recording === 'yes',
        loadSensor: row.load_sensor === 'yes',
        extraRecordingAtLeastMm:
          row.extra_recording_in === '' ? null : numberOf(row.extra_recording_in) * 25.4,
        overTemperature: row.overtemp_protection === 'yes',
      },
    });
  });

  test('a type that a table does not have is refused', () => {
    expect(instrumentation({ ...FURNACE_INSTRUMENTATION, rows: [] }, 'A')).toEqual({
      ok: false,
      reason: 'type_not_in_table',
    });
  });
});

describe('intervals', () => {
  const COLUMNS = ['class', 'type', 'sat_normal', 'sat_extended', 'tus_initial', 'tus_extended'] as const;
  const rows = publishedRows('pyrometry-intervals', COLUMNS);
  test.each(rows.map((row) => [row.class, row.type, saidBy(row), row] as const))(
    'class %s, type %s (%s)',
    (_class, _type, _said, row) => {
      for (const asked of row.class.split(', ').map((one) => oneOf(FURNACE_CLASSES, one)))
        for (const type of row.type.split(', ').map((one) => oneOf(INSTRUMENTATION_TYPES, one))) {
          const normal = testIntervals(PYROMETRY_INTERVALS, { class: asked, type, extended: false });
          expect(normal).toMatchObject({ ok: true, accuracyTest: row.sat_normal, survey: row.tus_initial });
          expect(normal.source).toMatchObject({ confidence: row.confidence, certainty: row.certainty });
          expect(testIntervals(PYROMETRY_INTERVALS, { class: asked, type, extended: true })).toMatchObject({
            accuracyTest: row.sat_extended,
            survey: row.tus_extended,
          });
        }
    },
  );

  test('what has no row is refused: type D+, and class 6 with more than type E', () => {
    for (const asked of [
      { class: 2, type: 'D+' },
      { class: 6, type: 'A' },
      { class: 1, type: 'E' },
    ] as const)
      expect(testIntervals(PYROMETRY_INTERVALS, { ...asked, extended: false })).toEqual({
        ok: false,
        reason: 'class_and_type_not_in_table',
      });
  });

  test('an earned interval is never shorter', () => {
    for (const row of PYROMETRY_INTERVALS.rows) {
      expect(INTERVALS.indexOf(row.accuracyTestExtended)).toBeGreaterThanOrEqual(
        INTERVALS.indexOf(row.accuracyTest),
      );
      expect(INTERVALS.indexOf(row.surveyExtended)).toBeGreaterThanOrEqual(INTERVALS.indexOf(row.survey));
    }
  });
});

describe('the day a test is due', () => {
  const rows = publishedRows('pyrometry-dates', ['tested_on', 'interval', 'due_on']);
  test.each(rows.map((row) => [row.interval, row.tested_on, saidBy(row), row] as const))(
    '%s after %s (%s)',
    (_interval, _on, _said, row) => {
      expect(nextDue(row.tested_on, oneOf(INTERVALS, row.interval))).toMatchObject({
        ok: true,
        dueOn: row.due_on,
      });
    },
  );

  test('the trap of a month as thirty days: monthly is the same day number, or the end of the month', () => {
    expect(nextDue('2026-01-31', 'monthly')).toMatchObject({ dueOn: '2026-02-28' });
    expect(nextDue('2026-02-15', 'monthly')).toMatchObject({ dueOn: '2026-03-15' });
    expect(nextDue('2026-07-15', 'monthly')).toMatchObject({ dueOn: '2026-08-15' });
    expect(nextDue('2025-11-30', 'quarterly')).toMatchObject({ dueOn: '2026-02-28' });
    expect(nextDue('2024-02-29', 'annual')).toMatchObject({ dueOn: '2025-02-28' });
  });

  test.each(['2026-02-30', '2026-13-01', '26-01-01', '2026-1-1', '', 'soon'])('"%s" is no day', (on) => {
    expect(nextDue(on, 'monthly')).toEqual({ ok: false, reason: 'not_a_date' });
  });

  const day = fc
    .date({ min: new Date('1950-01-01'), max: new Date('2100-01-01'), noInvalidDate: true })
    .map((date) => date.toISOString().slice(0, 10));
  test('a later test is never due earlier, and a longer interval never ends earlier', () => {
    fc.assert(
      fc.property(
        day,
        day,
        fc.constantFrom(...INTERVALS),
        fc.constantFrom(...INTERVALS),
        (one, other, a, b) => {
          const [early, late] = [one, other].toSorted();
          const [short, long] = INTERVALS.indexOf(a) < INTERVALS.indexOf(b) ? [a, b] : [b, a];
          const due = (on: string | undefined, interval: typeof a) => {
            const answer = nextDue(on ?? '', interval);
            return answer.ok ? answer.dueOn : '';
          };
          return due(early, a) <= due(late, a) && due(one, short) <= due(one, long) && due(one, a) > one;
        },
      ),
    );
  });

  test('from month to month the day number stays, or the month has no such day and ends', () => {
    fc.assert(
      fc.property(day, (on) => {
        const answer = nextDue(on, 'monthly');
        if (!answer.ok) return false;
        const after = new Date(`${answer.dueOn}T12:00:00Z`);
        after.setUTCDate(after.getUTCDate() + 1);
        return (
          answer.dueOn.slice(8) === on.slice(8) ||
          (answer.dueOn.slice(8) < on.slice(8) && after.getUTCDate() === 1)
        );
      }),
    );
  });
});

describe('survey locations', () => {
  const rows = publishedRows('pyrometry-survey-locations', ['volume_ft3', 'locations', 'control_within_F']);
  test.each(rows.map((row) => [row.volume_ft3, saidBy(row), row] as const))(
    '%s ft³ (%s)',
    (_volume, _said, row) => {
      const answer = surveyLocations(SURVEY_LOCATIONS, numberOf(row.volume_ft3) * 0.3048 ** 3);
      expect(answer).toMatchObject({ locations: numberOf(row.locations) });
      expect(answer.ok && answer.controlWithinC * 1.8).toBeCloseTo(numberOf(row.control_within_F), 9);
    },
  );

  test('1 m³ is 35.3 ft³: 9 places and 2 more; a part of 25 ft³ counts as a whole one', () => {
    expect(surveyLocations(SURVEY_LOCATIONS, 1)).toMatchObject({ ok: true, locations: 11 });
    expect(surveyLocations(SURVEY_LOCATIONS, 25.1 * 0.3048 ** 3)).toMatchObject({ locations: 11 });
    expect(surveyLocations(SURVEY_LOCATIONS, 0)).toMatchObject({ ok: false, reason: 'volume_not_positive' });
    expect(surveyLocations({ ...SURVEY_LOCATIONS, rows: [] }, 1)).toMatchObject({ reason: 'table_empty' });
  });
});

describe('is the furnace good for the cycle on this day?', () => {
  const TABLES = { classes: FURNACE_UNIFORMITY, intervals: PYROMETRY_INTERVALS };
  const FURNACE: Furnace = { class: 5, type: 'B', extended: false };
  const CYCLE: Cycle = { fromC: 843, toC: 857, class: 5 };
  const SURVEY: FurnaceTest = { kind: 'survey', on: '2026-01-31', passed: true, fromC: 800, toC: 900 };
  const ACCURACY: FurnaceTest = {
    kind: 'accuracy_test',
    on: '2026-04-10',
    passed: true,
    fromC: 850,
    toC: 850,
  };
  const ask = (changes: Partial<{ furnace: Furnace; cycle: Cycle; on: string; tests: FurnaceTest[] }>) => {
    const answer = isFurnaceGoodFor(TABLES, {
      furnace: FURNACE,
      cycle: CYCLE,
      on: '2026-04-30',
      tests: [SURVEY, ACCURACY],
      ...changes,
    });
    if (!answer.ok) throw new Error(answer.reason);
    return { ...answer, faults: answer.findings.map(({ fault }) => fault) };
  };

  test('a quarterly survey of 31 January is in time until 30 April, and no longer', () => {
    expect(ask({})).toMatchObject({ good: true, goodUntil: '2026-04-30', faults: [] });
    expect(ask({ on: '2026-05-01' })).toMatchObject({
      good: false,
      goodUntil: null,
      findings: [{ fault: 'survey_overdue', dueOn: '2026-04-30' }],
    });
  });

  test('the longer interval must have been earned', () => {
    expect(ask({ on: '2026-05-01', furnace: { ...FURNACE, extended: true } })).toMatchObject({
      good: true,
      goodUntil: '2026-07-10',
    });
  });

  test.each<[string, FurnaceTest[], string[]]>([
    ['nothing is known', [], ['never_surveyed', 'never_accuracy_tested']],
    ['the survey was made after the day', [{ ...SURVEY, on: '2026-05-02' }, ACCURACY], ['never_surveyed']],
    [
      'the last survey failed',
      [SURVEY, { ...SURVEY, on: '2026-03-01', passed: false }, ACCURACY],
      ['survey_failed'],
    ],
    ['a failed survey was repeated', [{ ...SURVEY, on: '2026-01-01', passed: false }, SURVEY, ACCURACY], []],
    ['it was surveyed only colder', [{ ...SURVEY, toC: 850 }, ACCURACY], ['outside_surveyed_range']],
    [
      'a later survey is of other temperatures',
      [SURVEY, { ...SURVEY, on: '2026-04-01', fromC: 100, toC: 300 }, ACCURACY],
      [],
    ],
    ['the accuracy test is overdue', [SURVEY, { ...ACCURACY, on: '2026-03-29' }], ['accuracy_test_overdue']],
    ['the accuracy test failed', [SURVEY, { ...ACCURACY, passed: false }], ['accuracy_test_failed']],
  ])('%s', (_name, tests, faults) => {
    expect(ask({ tests })).toMatchObject({ good: faults.length === 0, faults });
  });

  test('a class 5 furnace is too loose for aluminium, and both tables are named', () => {
    const answer = ask({ cycle: { ...CYCLE, class: 2 } });
    expect(answer.faults).toEqual(['class_too_loose']);
    expect(answer.findings[0]?.readFrom?.table).toBe('furnace-classes');
    expect(answer.readFrom?.table).toBe('pyrometry-intervals');
  });

  test('what cannot be judged is refused', () => {
    const asked = { furnace: FURNACE, cycle: CYCLE, on: '2026-04-30', tests: [SURVEY] };
    expect(isFurnaceGoodFor(TABLES, { ...asked, on: '2026-04-31' })).toEqual({
      ok: false,
      reason: 'not_a_date',
    });
    expect(isFurnaceGoodFor(TABLES, { ...asked, tests: [{ ...SURVEY, on: '' }] })).toEqual({
      ok: false,
      reason: 'not_a_date',
    });
    expect(isFurnaceGoodFor(TABLES, { ...asked, cycle: { ...CYCLE, toC: 1 } })).toEqual({
      ok: false,
      reason: 'range_reversed',
    });
    expect(isFurnaceGoodFor(TABLES, { ...asked, furnace: { ...FURNACE, type: 'D+' } })).toEqual({
      ok: false,
      reason: 'class_and_type_not_in_table',
    });
  });

  test('a newer passed test never makes a good furnace bad', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 30 }), (date) => {
        const on = `2026-04-${String(date).padStart(2, '0')}`;
        return ask({ tests: [SURVEY, ACCURACY, { ...SURVEY, on }, { ...ACCURACY, on }] }).good;
      }),
    );
  });
});
