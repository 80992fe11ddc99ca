import fc from 'fast-check';
import { expect, test } from 'vitest';
import { dayOf, daysIn } from '@/lib/evidence/certificate/read/dates';
import { momentsIn } from '@/lib/evidence/certificate/read/moments';

test.each([
  ['2026-03-05', '2026-03-05'],
  ['5 March 2026', '2026-03-05'],
  ['05-MAR-26', '2026-03-05'],
  ['March 5, 2026', '2026-03-05'],
  ['5. März 2026', '2026-03-05'],
  ['05.03.2026', '2026-03-05'],
  ['13/04/26', '2026-04-13'],
  ['04/13/26', '2026-04-13'],
  ['l2 MAR 2O26', '2026-03-12'],
])('%s can be read in one way', (written, day) => {
  const [found] = daysIn(written);
  expect(found && dayOf(found, null)).toBe(day);
});

test('03/04/2026 is nothing until the document shows its order', () => {
  const [found] = daysIn('03/04/2026');
  if (!found) throw new Error('not found');
  expect([dayOf(found, null), dayOf(found, 'day_first'), dayOf(found, 'month_first')]).toEqual([
    null,
    '2026-04-03',
    '2026-03-04',
  ]);
});

test.each(['10-200-12', 'MIL-DTL-5541', '31/02/2026', 'PO-26-703', '1/2'])('%s is no day', (written) =>
  expect(daysIn(written)).toEqual([]),
);

test.each([
  ['9:12 PM', '21:12'],
  ['0912 hrs', '09:12'],
  ['12:05 AM', '00:05'],
  ['14h30', '14:30'],
])('%s is %s', (written, time) => expect(momentsIn(written)[0]?.time).toBe(time));

test('four figures alone are a time only where one is asked for', () => {
  expect(momentsIn('0912')).toEqual([]);
  expect(momentsIn('0912', true)[0]?.time).toBe('09:12');
});

test('a day written in any way is read as itself', () => {
  const day = fc.date({ min: new Date('2001-01-01'), max: new Date('2098-12-31'), noInvalidDate: true });
  fc.assert(
    fc.property(day, (date) => {
      const iso = date.toISOString().slice(0, 10);
      const [y = '', m = '', d = ''] = iso.split('-');
      for (const written of [
        iso,
        `${d}.${m}.${y}`,
        `${d} ${['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'][Number(m) - 1]} ${y}`,
      ]) {
        const [found] = daysIn(written);
        expect(found && dayOf(found, null)).toBe(iso);
      }
      const [american] = daysIn(`${m}/${d}/${y}`);
      expect(american && dayOf(american, 'month_first')).toBe(iso);
    }),
  );
});
