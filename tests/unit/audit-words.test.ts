import { expect, test } from 'vitest';

import { actionWords } from '@/lib/audit/action-words';
import { changesBetween, pageOfThing } from '@/lib/audit/words';

test('only what is different is told, in words', () => {
  expect(
    changesBetween(
      { zone: 'UTC', name: 'Yard', active: true, note: null },
      { zone: 'Europe/Oslo', name: 'Yard', active: false, note: '' },
    ),
  ).toEqual([
    { field: 'zone', before: 'UTC', after: 'Europe/Oslo' },
    { field: 'active', before: 'yes', after: 'no' },
  ]);
});

test('lists and things inside are words too, without ids and without nothing', () => {
  const [change] = changesBetween(null, {
    lines: [
      { id: '01a23042-b8c2-71fc-92a8-183aa52375a4', lineNo: 1, good: 8, note: null },
      { lineNo: 2, good: 3, note: 'wet' },
    ],
    roles: ['lead', 'admin'],
  });
  expect(change).toEqual({
    field: 'lines',
    before: null,
    after: 'line no 1, good 8; line no 2, good 3, note wet',
  });
});

test('an id of its own is no change that a reader could read', () =>
  expect(
    changesBetween(null, {
      number: 'B-0060',
      processorId: '01a23042-b8c2-71fc-92a8-183aa52375a4',
      links: ['01a23042-b8c2-71fc-92a8-183aa52375a4'],
    }),
  ).toEqual([{ field: 'number', before: null, after: 'B-0060' }]));

test('an action is told as what was done, and what is no verb stays as it is', () => {
  expect(actionWords('processor.withdraw_approval')).toBe('withdrew approval');
  expect(actionWords('batch.dispatch')).toBe('dispatched');
  expect(actionWords('invoice.payment_failed')).toBe('payment failed');
});

test('a thing with a page links to it', () => {
  expect(pageOfThing('batch', 'b1')).toBe('/batches/b1');
  expect(pageOfThing('token', 't1')).toBeNull();
});

test('a moment is told to the minute, and anything that only looks like one stays as it is', () => {
  const told = (value: string) => changesBetween(null, { at: value })[0]?.after;
  expect(told('2026-12-01T09:26:41.569Z')).toBe('2026-12-01 09:26 UTC');
  expect(told('2026-12-01')).toBe('2026-12-01');
  expect(told('see 2026-12-01T09:26:41Z')).toBe('see 2026-12-01T09:26:41Z');
});
