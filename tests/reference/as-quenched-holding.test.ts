import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { dryIceFor } from '@/lib/trade/heat-treat/dry-ice';
import { holdingClock, type ColdStay } from '@/lib/trade/heat-treat/holding-clock';
import { timeLeft } from '@/lib/trade/heat-treat/time-left';
import { reworkWindow, rivetHolding } from '@/lib/trade/heat-treat/working-windows';
import { DRY_ICE } from '@/lib/trade/tables/dry-ice';
import { HOLDING_LIMITS, REWORK_WINDOWS, RIVET_HOLDING } from '@/lib/trade/tables/holding-limits';
import { celsiusFromFahrenheit } from '@/lib/trade/units/temperature';

import { alloyOf } from './trade-words';
import { casesOf, numberOf, publishedRows } from './values';

const DAY = 1440;
/** Minutes after the quench. */
const at = (min: number) => new Date(Date.UTC(2026, 0, 5, 9, min));
const clock = (stays: readonly ColdStay[], alloy: '2024' | '7075' = '2024') =>
  holdingClock(HOLDING_LIMITS, { alloy, quenchedAt: at(0), stays });

describe('the clock', () => {
  test('2024 keeps 15 min; at -20 °C 30 days from when it was put in; and out of there what is left', () => {
    expect(clock([])).toMatchObject({ ok: true, where: 'at_room_temperature', endsAt: at(15) });
    const putInAt = at(10);
    expect(clock([{ putInAt, temperatureC: -20 }])).toMatchObject({
      where: 'in_the_cold',
      endsAt: at(10 + 30 * DAY),
      roomUsedMin: 10,
    });
    expect(clock([{ putInAt, takenOutAt: at(DAY), temperatureC: -20 }])).toMatchObject({
      where: 'at_room_temperature',
      endsAt: at(DAY + 5),
      coldUsedMin: DAY - 10,
    });
  });

  test.each(
    casesOf(
      publishedRows('holding-limits', ['alloy', 'cold_f', 'days', 'room_min']),
      (row) =>
        `${row.alloy} keeps ${row.days ? `${row.days} days at ${row.cold_f} °F` : `${row.room_min} min`}`,
    ),
  )('%s', (_name, row) => {
    const alloy = alloyOf(row.alloy);
    const stays = row.cold_f
      ? [{ putInAt: at(1), temperatureC: celsiusFromFahrenheit(numberOf(row.cold_f)) }]
      : [];
    const held = holdingClock(HOLDING_LIMITS, { alloy, quenchedAt: at(0), stays });
    if (!held.ok) throw new Error(held.reason);
    expect(held.roomLimitMin).toBe(numberOf(row.room_min));
    expect(held.endsAt).toEqual(row.days ? at(1 + numberOf(row.days) * DAY) : at(numberOf(row.room_min)));
    expect(held.source).toMatchObject({ confidence: row.confidence, certainty: row.certainty });
  });

  test('the trap of a new quarter of an hour each time out of the cold: times outside add up', () => {
    const stays = [
      { putInAt: at(8), takenOutAt: at(100), temperatureC: -25 },
      { putInAt: at(105), takenOutAt: at(200), temperatureC: -25 },
    ];
    expect(clock(stays)).toMatchObject({ roomUsedMin: 13, endsAt: at(202) });
  });

  test('the warmest store that it was in sets the limit of all its time in the cold', () => {
    const stays = [
      { putInAt: at(2), takenOutAt: at(62), temperatureC: -12.3 },
      { putInAt: at(64), temperatureC: -30 },
    ];
    expect(clock(stays)).toMatchObject({ coldLimitMin: DAY, coldUsedMin: 60, endsAt: at(64 + DAY - 60) });
  });

  test.each([
    ['an alloy without a row', '5052', [], 'alloy_not_in_table'],
    ['a store warmer than 10 °F', '2024', [{ putInAt: at(1), temperatureC: -5 }], 'not_cold_enough'],
    ['too long outside', '2024', [{ putInAt: at(16), temperatureC: -25 }], 'room_time_exceeded'],
    [
      'too long in the cold',
      '2024',
      [{ putInAt: at(1), takenOutAt: at(2 * DAY), temperatureC: -13 }],
      'cold_time_exceeded',
    ],
    [
      'taken out before it was put in',
      '2024',
      [{ putInAt: at(9), takenOutAt: at(3), temperatureC: -25 }],
      'times_out_of_order',
    ],
    [
      'put in twice and never taken out',
      '2024',
      [
        { putInAt: at(1), temperatureC: -25 },
        { putInAt: at(2), temperatureC: -25 },
      ],
      'times_out_of_order',
    ],
  ] as const)('%s is refused', (_name, alloy, stays, reason) => {
    expect(holdingClock(HOLDING_LIMITS, { alloy, quenchedAt: at(0), stays })).toMatchObject({ reason });
  });

  test('at -10 °F the soft state lasts several days and longer (processor page)', () => {
    const held = clock([{ putInAt: at(1), temperatureC: celsiusFromFahrenheit(-10) }]);
    expect(held.ok && held.coldLimitMin).toBeGreaterThan(3 * DAY);
  });

  test('a colder store never keeps it for less time, and the end is never before the last time given', () => {
    const temperature = fc.double({ min: -80, max: -12.5, noNaN: true });
    fc.assert(
      fc.property(temperature, temperature, fc.integer({ min: 0, max: 15 }), (a, b, min) => {
        const warm = clock([{ putInAt: at(min), temperatureC: Math.max(a, b) }]);
        const cold = clock([{ putInAt: at(min), temperatureC: Math.min(a, b) }]);
        if (!warm.ok || !cold.ok) throw new Error('refused');
        expect(warm.endsAt.getTime()).toBeLessThanOrEqual(cold.endsAt.getTime());
        expect(warm.endsAt.getTime()).toBeGreaterThanOrEqual(at(min).getTime());
      }),
    );
  });
});

describe('windows of work', () => {
  test.each([
    ['2024', 'form', [30, 30], 'trade practice, from memory'],
    ['7075', 'form', [120, 120], 'trade practice, from memory'],
    ['2024', 'straighten', [60, 120], 'trade forum, an opinion'],
    ['6061', 'straighten', [60, 120], 'trade forum, an opinion'],
  ] as const)('%s: %s within %j min (%s)', (alloy, work, withinMin, _source) => {
    expect(reworkWindow(REWORK_WINDOWS, { alloy, work })).toMatchObject({ ok: true, withinMin });
  });

  test('6061 forms for several hours, which is no figure', () => {
    expect(reworkWindow(REWORK_WINDOWS, { alloy: '6061', work: 'form' })).toEqual({
      ok: false,
      reason: 'no_figure',
    });
  });
});

describe('rivets', () => {
  test.each([
    ['2024', 5, [10, 20]],
    ['2017', 30, [60, 60]],
  ] as const)(
    '%s goes into the cold within %d min (structural repair manual), is driven within %j min and keeps two weeks (FAA-H-8083-31, from memory)',
    (alloy, intoColdWithinMin, driveWithinMin) => {
      expect(rivetHolding(RIVET_HOLDING, alloy)).toMatchObject({
        asReceived: false,
        intoColdWithinMin,
        driveWithinMin,
        keepsDays: 14,
      });
    },
  );

  test('2117 is driven as received (from memory); other alloys are refused', () => {
    expect(rivetHolding(RIVET_HOLDING, '2117')).toMatchObject({ ok: true, asReceived: true });
    expect(rivetHolding(RIVET_HOLDING, '7075')).toEqual({ ok: false, reason: 'alloy_not_in_table' });
  });
});

describe('dry ice', () => {
  test("a day of air freight takes 5 to 10 lb: 2.27 to 4.54 kg (carriers' fact sheets)", () => {
    const ice = dryIceFor(DRY_ICE, { hours: 24, by: 'air_freight' });
    expect(ice).toMatchObject({
      ok: true,
      surfaceC: -78,
      unNumber: 'UN1845',
      packingInstruction: '954',
      mustVent: true,
      maxKg: 200,
    });
    expect(ice.ok && ice.needsKg.map((kg) => kg.toFixed(2))).toEqual(['2.27', '4.54']);
  });

  test('5 lb by US air mail last less than a day, and are refused for one', () => {
    const ice = dryIceFor(DRY_ICE, { hours: 12, by: 'us_air_mail' });
    expect(ice.ok && ice.maxKg.toFixed(3)).toBe('2.268');
    expect(dryIceFor(DRY_ICE, { hours: 24, by: 'us_air_mail' })).toMatchObject({
      reason: 'too_much_for_one_package',
    });
    expect(dryIceFor(DRY_ICE, { hours: -1, by: 'air_freight' })).toMatchObject({ reason: 'hours_negative' });
  });
});

describe('what is left of a time', () => {
  const span = { begins: at(0), ends: at(15) };
  const state = (min: number) => timeLeft(span, at(min)).state;

  test('of 15 min the last three warn; at the end it is over', () =>
    expect([-1, 0, 11, 12, 14, 15, 20].map(state)).toEqual([
      'not_begun',
      'running',
      'running',
      'near_end',
      'near_end',
      'over',
      'over',
    ]));

  test('of 90 days only the last day warns', () => {
    const cold = { begins: at(0), ends: at(90 * DAY) };
    expect(timeLeft(cold, at(89 * DAY - 1)).state).toBe('running');
    expect(timeLeft(cold, at(89 * DAY)).state).toBe('near_end');
  });

  test('what is left never grows, and what is over never shrinks', () => {
    fc.assert(
      fc.property(fc.integer({ min: -60, max: 60 }), fc.integer({ min: 0, max: 60 }), (first, later) => {
        const [before, after] = [timeLeft(span, at(first)), timeLeft(span, at(first + later))];
        expect(after.leftMs).toBeLessThanOrEqual(before.leftMs);
        expect(after.overMs).toBeGreaterThanOrEqual(before.overMs);
        expect(after.leftMs - after.overMs).toBe(span.ends.getTime() - at(first + later).getTime());
      }),
    );
  });
});
