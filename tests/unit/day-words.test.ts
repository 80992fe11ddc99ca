import { describe, expect, test } from 'vitest';
import {
  addDays,
  calendarDay,
  type Clock,
  daysUntil,
  dayWords,
  momentWords,
  shortDayWords,
  timeWords,
  untilWords,
} from '@/lib/day-words';

const clock: Clock = { zone: 'America/Halifax', now: new Date('2026-04-16T11:40:00Z') };

describe('days in words', () => {
  test('a day of this year is said without its year', () =>
    expect(dayWords('2026-04-30', clock)).toBe('Thu 30 Apr'));
  test('a day of another year is said with it', () =>
    expect(dayWords('2027-01-11', clock)).toBe('Mon 11 Jan 2027'));
  test('a single figure stands alone', () => expect(shortDayWords('2026-05-04', clock)).toBe('4 May'));

  test('a moment is told by the clock of the shop, in 24 hours', () => {
    expect(momentWords(new Date('2026-04-15T19:40:00Z'), clock)).toBe('Wed 15 Apr 16:40');
    expect(timeWords(new Date('2026-04-16T03:00:00Z'), clock.zone)).toBe('00:00');
  });

  test('late in the evening the shop is still in yesterday', () =>
    expect(calendarDay(new Date('2026-04-16T02:59:00Z'), clock.zone)).toBe('2026-04-15'));

  test('every month has three letters, September too', () =>
    expect(shortDayWords('2026-09-01', clock)).toBe('1 Sep'));
});

describe('how long until then', () => {
  test.each([
    ['2026-04-10', -6, '6 d late'],
    ['2026-04-16', 0, 'today'],
    ['2026-04-21', 5, 'in 5 d'],
  ])('%s is %i days away: %s', (day, days, words) => {
    expect(daysUntil(day, clock)).toBe(days);
    expect(untilWords(day, clock)).toBe(words);
  });

  test('a change of the clocks is still one day', () => expect(addDays('2026-03-07', 2)).toBe('2026-03-09'));
});

test('what is not a day is refused, not guessed', () =>
  expect(() => dayWords('16.4.2026', clock)).toThrow(RangeError));
