import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { addDays, daysBetween } from '@/lib/day-words';
import type { Tideline, TidelineBatch } from '@/lib/tideline/contract';
import { daysLate } from '@/lib/tideline/lateness';
import { layOut, outsideWords, type PlacedTag } from '@/lib/tideline/lay-out';
import { daysOf, scaleFor, xOf } from '@/lib/tideline/scale';

const TODAY = '2026-04-16';
const PROCESSOR = '019d0000-0000-7000-8000-000000000001';
const scale = scaleFor({ widthPx: 1130, dayPx: 18, today: TODAY, dayShare: 0.4 });

const OUT: TidelineBatch = {
  id: '019d0000-0000-7000-8000-000000000002',
  number: 'B-0001',
  stage: 'at_processor',
  processorId: PROCESSOR,
  pieces: 41,
  piecesBack: 0,
  contents: '41 chine angles',
  leavesOn: null,
  dispatchedOn: '2026-04-06',
  acknowledged: true,
  wantedBackOn: '2026-04-20',
  promisedOn: '2026-04-20',
  firstPromisedOn: '2026-04-20',
  brokenPromises: [],
  lastBackOn: null,
  receiptsOn: [],
  heldSince: null,
  nonconformance: null,
  openQuestion: null,
  certificatesToProve: 0,
  firstCertificateId: null,
  invoice: null,
  assembly: null,
};

const tidelineOf = (
  batches: readonly TidelineBatch[],
  latenessBasis: Tideline['latenessBasis'] = 'latest_promise',
): Tideline => ({
  today: TODAY,
  now: '2026-04-16T17:00:00Z',
  zone: 'America/Los_Angeles',
  latenessBasis,
  lanes: [{ processorId: PROCESSOR, name: 'Galena Thermal', processes: [], approvedTo: null }],
  batches: [...batches],
  assemblies: [],
  started: { parts: 1, lots: 1, processors: 1, batches: 1 },
});
const laneOf = (...batches: TidelineBatch[]) => {
  const [lane] = layOut(tidelineOf(batches), scale);
  if (!lane) throw new Error('no lane');
  return lane;
};
const tagOf = (batch: Partial<TidelineBatch>): PlacedTag => {
  const [tag] = laneOf({ ...OUT, ...batch }).tags;
  if (!tag) throw new Error('no tag');
  return tag;
};

describe('the scale', () => {
  test('today stands at 58 % of the width', () => expect(scale.todayX / scale.widthPx).toBeCloseTo(0.58, 1));

  test('weekends and Mondays are those of the calendar', () => {
    const days = daysOf(scale);
    // 13 April 2026 is a Monday.
    expect(days.find(({ day }) => day === '2026-04-13')).toMatchObject({ isMonday: true, isWeekend: false });
    expect(days.filter(({ isWeekend }) => isWeekend).map(({ day }) => day)).toContain('2026-04-12');
  });
});

describe('where a tag stands', () => {
  test('from the day out to the end of the promised day', () => {
    const tag = tagOf({});
    expect(tag.x).toBe(xOf(scale, '2026-04-06'));
    expect(tag.x + tag.width).toBe(xOf(scale, '2026-04-21'));
    expect(tag).toMatchObject({ late: null, fading: false, torn: false });
  });

  test('until the day of the last receipt when everything is back', () => {
    const tag = tagOf({
      stage: 'returned',
      piecesBack: 41,
      lastBackOn: '2026-04-14',
      receiptsOn: ['2026-04-14'],
    });
    expect(tag.x + tag.width).toBe(xOf(scale, '2026-04-15'));
    expect(tag.after).toBe('no papers yet');
  });

  test('a notch at each receipt of a part delivery, and how many are back', () => {
    const tag = tagOf({ piecesBack: 12, receiptsOn: ['2026-04-10', '2026-04-13'], lastBackOn: '2026-04-13' });
    expect(tag.notches).toEqual([4 * 18, 7 * 18]);
    expect(tag.after).toBe('12 of 41 back');
  });

  test('right of the line while it is built, and it says when it should have left', () => {
    const built = { stage: 'building' as const, dispatchedOn: null, promisedOn: null };
    expect(tagOf({ ...built, leavesOn: '2026-04-20' }).x).toBe(xOf(scale, '2026-04-20'));
    const overdue = tagOf({ ...built, leavesOn: '2026-04-14' });
    expect(overdue.x).toBeGreaterThan(scale.todayX);
    expect(overdue.after).toBe('should have left');
  });

  test('late: the tag ends where it was promised, the flag counts the days since', () => {
    const tag = tagOf({ promisedOn: '2026-04-10' });
    expect(tag.late).toEqual({ days: 6, fromX: xOf(scale, '2026-04-11') });
  });

  test('late by the first promise or by the latest, as the shop chose; a broken one stays as a tick', () => {
    const moved = { ...OUT, firstPromisedOn: '2026-04-14', brokenPromises: ['2026-04-14'] };
    expect(daysLate(moved, TODAY, 'first_promise')).toBe(2);
    expect(daysLate(moved, TODAY, 'latest_promise')).toBe(0);
    expect(tagOf(moved).brokenX).toEqual([9 * 18]);
  });

  test('nobody promised it, so it fades and is not late, whatever day was asked', () =>
    expect(tagOf({ promisedOn: null, firstPromisedOn: null, wantedBackOn: '2026-04-01' })).toMatchObject({
      fading: true,
      late: null,
    }));

  test('begun left of the page: torn, at the edge', () =>
    expect(tagOf({ dispatchedOn: '2025-12-01', promisedOn: '2026-01-10' })).toMatchObject({
      torn: true,
      x: 0,
    }));

  test('held: for how long, and its nonconformance', () =>
    expect(
      tagOf({
        stage: 'held',
        heldSince: '2026-04-03',
        nonconformance: { id: OUT.id, number: 'NC-0037', what: 'soft' },
      }).after,
    ).toBe('held 13 d, NC-0037'));

  test('what has no room inside stands outside, so that number and stage are always there', () => {
    const tag = tagOf({ dispatchedOn: '2026-04-15', promisedOn: '2026-04-16' });
    expect(tag.show).toBe('mark');
    expect(outsideWords(tag)).toBe('B-0001 at processor');
  });
});

describe('the thread to the assembly that waits', () => {
  const waiting = (neededOn: string, more = 0) =>
    tagOf({ assembly: { id: OUT.id, name: 'Left float', neededOn, more } }).string;

  test('a knot on the day of need', () => {
    const thread = waiting('2026-05-04');
    expect(thread).toMatchObject({ tooLate: false, name: 'Left float', day: '4 May' });
    expect(thread?.knotX).toBe(xOf(scale, '2026-05-04') + 9);
  });

  test('needed before the end: words, no knot', () =>
    expect(waiting('2026-04-10', 2)).toMatchObject({
      tooLate: true,
      knotX: null,
      name: 'Left float and 2 more',
    }));
});

describe('rows', () => {
  const numbersOf = (tags: readonly PlacedTag[]) => tags.map(({ batch }) => batch.number);

  test('held first, then the latest, then no date, then by the day out', () => {
    const lane = laneOf(
      { ...OUT, id: '1', number: 'B-5' },
      { ...OUT, id: '2', number: 'B-4', promisedOn: null },
      { ...OUT, id: '3', number: 'B-3', promisedOn: '2026-04-14' },
      { ...OUT, id: '4', number: 'B-2', promisedOn: '2026-04-10' },
      { ...OUT, id: '5', number: 'B-1', stage: 'held', heldSince: '2026-04-14' },
    );
    expect(numbersOf(lane.tags)).toEqual(['B-1', 'B-2', 'B-3', 'B-4', 'B-5']);
  });

  test('over eight rows: three of the pressing ones stay whole, the rest become slips, none is lost', () => {
    const lane = laneOf(
      ...Array.from({ length: 30 }, (_, at) => ({
        ...OUT,
        id: String(at),
        number: `B-${at}`,
        promisedOn: at < 5 ? '2026-04-10' : '2026-04-20',
      })),
    );
    expect(lane.tags).toHaveLength(3);
    expect(lane.moreLate).toBe(2);
    expect(lane.slips).toHaveLength(27);
    expect(lane.slips.every(({ y, height }) => y + height <= lane.height)).toBe(true);
  });

  test('a row holds tags that do not touch, and every batch is drawn once, however they lie', () => {
    const batch = fc
      .record({ out: fc.integer({ min: -60, max: 0 }), stays: fc.integer({ min: 0, max: 8 }) })
      .map(({ out, stays }) => ({
        dispatchedOn: addDays(TODAY, out),
        promisedOn: addDays(TODAY, out + stays),
        // Back, so that its tag ends: one that is late reaches to today and shares no row.
        stage: 'stocked' as const,
        piecesBack: OUT.pieces,
        lastBackOn: addDays(TODAY, out + stays),
      }));
    fc.assert(
      fc.property(fc.array(batch, { maxLength: 40 }), (days) => {
        const batches = days.map((one, at) => ({ ...OUT, ...one, id: String(at), number: `B-${at}` }));
        const lane = laneOf(...batches);
        const drawn = [...lane.tags, ...lane.slips].map(({ batch: { id } }) => id);
        expect(drawn.toSorted()).toEqual(batches.map(({ id }) => id).toSorted());
        for (const tag of lane.tags)
          for (const other of lane.tags.filter(
            ({ row, batch: { id } }) => row === tag.row && id !== tag.batch.id,
          ))
            expect(tag.x + tag.width <= other.x || other.x + other.width <= tag.x).toBe(true);
      }),
    );
  });
});

test('days between are the inverse of adding days, over ends of months, years and changes of the clock', () => {
  fc.assert(
    fc.property(fc.integer({ min: -4000, max: 4000 }), (days) => {
      expect(daysBetween(TODAY, addDays(TODAY, days))).toBe(days);
    }),
  );
});
