import { expect, test } from 'vitest';

import {
  countdownWords,
  fieldMoment,
  momentWords,
  onTheWall,
  readMoment,
  spanWords,
  zoneWords,
} from '@/components/reference/bench-moment';
import { readZone } from '@/components/reference/holding-fields';

test('a moment is read and said by the same clock', () => {
  const at = readMoment('2026-12-01T14:10');
  expect(at && momentWords(at)).toBe('Tue 1 Dec 2026, 14:10');
  expect(readMoment('')).toBeNull();
  expect(readMoment('2026-13-01T14:10')).toBeNull();
});

test.each([
  [5, '5 min'],
  [150, '2 h 30 min'],
  [43_200, '30 days'],
  [0, '0 min'],
])('%i minutes are %s', (minutes, says) => {
  expect(spanWords(minutes)).toBe(says);
});

test.each([
  [0, '0:00'],
  [1, '0:01'],
  [725_000, '12:05'],
  [3_599_001, '1 h'],
  [9_000_000, '2 h 30 min'],
])('%i ms left are %s', (ms, says) => {
  expect(countdownWords(ms)).toBe(says);
});

test('a moment is put on the wall of a zone, and into a field by the minute it lies in', () => {
  const at = new Date('2026-12-01T19:10:59Z');
  expect(fieldMoment(onTheWall(at, -300))).toBe('2026-12-01T14:10');
  expect(fieldMoment(onTheWall(at, 330))).toBe('2026-12-02T00:40');
});

test.each([
  ['-300', -300, 'UTC−5'],
  ['330', 330, 'UTC+5:30'],
  ['0', 0, 'UTC+0'],
])('the zone %s of an address is read and said', (typed, zone, says) => {
  expect(readZone(typed)).toBe(zone);
  expect(zoneWords(zone)).toBe(says);
});

test.each(['', 'x?', '9999', '1e3', '841'])('%j is no zone', (typed) => expect(readZone(typed)).toBeNull());
