import { expect, test } from 'vitest';

import { dayChoices } from '@/lib/portal/day-choices';

// A Thursday; at this moment it is still Wednesday evening in Los Angeles.
const now = new Date('2026-03-26T05:00:00Z');
const days = (wanted: string | null, zone = 'UTC') =>
  dayChoices(wanted, { zone, now }).map(({ day, asked }) => (asked ? `${day} asked` : day));

test.each([
  ['the asked Friday and the Monday after', '2026-04-10', ['2026-04-10 asked', '2026-04-13']],
  ['asked for today', '2026-03-26', ['2026-03-26 asked', '2026-03-27']],
  ['the asked day is past', '2026-03-25', ['2026-03-27', '2026-03-30']],
  ['no day was asked', null, ['2026-03-27', '2026-03-30']],
  ['a Saturday may be asked for, not proposed', '2026-03-28', ['2026-03-28 asked', '2026-03-30']],
])('%s', (_, wanted, expected) => expect(days(wanted)).toEqual(expected));

test('today is the day in the zone of the shop', () =>
  expect(days('2026-03-25', 'America/Los_Angeles')).toEqual(['2026-03-25 asked', '2026-03-26']));
