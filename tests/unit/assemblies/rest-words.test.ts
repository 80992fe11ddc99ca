import { expect, test } from 'vitest';

import { readyOf, stillToMake, waitWords, yardWords } from '@/components/assemblies/rest-words';

const clock = { zone: 'UTC', now: new Date('2026-04-16T12:00:00Z') };
const wait = (part: Partial<Parameters<typeof waitWords>[0]>) =>
  waitWords(
    {
      stage: 'at_processor',
      processor: 'Galena Thermal',
      promisedOn: '2026-04-20',
      packed: 0,
      away: 0,
      back: 0,
      held: 0,
      ...part,
    },
    clock,
  );

test.each([
  ['promised', { away: 3 }, '3 at Galena Thermal until Mon 20 Apr'],
  ['promised today', { away: 3, promisedOn: '2026-04-16' }, '3 at Galena Thermal until today'],
  ['no date', { away: 3, promisedOn: null }, '3 at Galena Thermal, no date yet'],
  [
    'on the way',
    { away: 3, stage: 'dispatched' as const, promisedOn: null },
    '3 on the way to Galena Thermal, no date yet',
  ],
  ['packed', { packed: 5 }, '5 packed for Galena Thermal'],
  ['back', { back: 12, stage: 'returned' as const }, '12 back from Galena Thermal, to prove'],
  ['back of a held batch', { back: 12, stage: 'held' as const }, '12 back from Galena Thermal, counted in'],
])('%s', (_, part, says) => expect(wait(part)).toEqual([{ says }]));

test('late says by how much, in red', () =>
  expect(wait({ away: 3, promisedOn: '2026-04-10' })).toEqual([
    { says: '3 at Galena Thermal, promised Fri 10 Apr, 6 d late', tone: 'late' },
  ]));

test('each whereabouts of one batch is a line of its own', () =>
  expect(wait({ away: 3, back: 2, held: 1, stage: 'held' }).map((one) => one.tone)).toEqual([
    undefined,
    undefined,
    'held',
  ]));

test('one waits, two wait', () => {
  const says = (pieces: number) => yardWords({ waiting: [{ process: 'anodize', pieces }] })[0]?.says;
  expect(says(1)).toBe('1 waits for anodize');
  expect(says(6)).toBe('6 wait for anodize');
});

const need = { pieces: 20, fitted: 4, inStock: 6, batches: [], waiting: [] };

test('ready is what is fitted or lies there, and never more than is needed', () => {
  expect(readyOf(need)).toBe(10);
  expect(readyOf({ ...need, inStock: 100 })).toBe(20);
});

test('still to make is what is nowhere, and never below nothing', () => {
  expect(stillToMake(need)).toBe(10);
  expect(stillToMake({ ...need, waiting: [{ process: 'anodize', pieces: 7 }] })).toBe(3);
  expect(stillToMake({ ...need, waiting: [{ process: 'anodize', pieces: 70 }] })).toBe(0);
});
