import { expect, test } from 'vitest';

import type { PortalLine } from '@/lib/portal/contract';
import { countOf, type Counting } from '@/lib/portal/count-of';

const line = (part: Partial<PortalLine> & { id: string }): PortalLine => ({
  lineNo: 1,
  part: 'P-1',
  name: 'Rib clip',
  material: '2024 sheet',
  lotNumber: 'L-0001',
  conditionBefore: null,
  targetCondition: null,
  note: null,
  loadNo: null,
  serials: [],
  pieces: 10,
  onTheWay: 10,
  here: 0,
  onTheWayBack: 0,
  ...part,
});
const two = [line({ id: 'a' }), line({ id: 'b', lineNo: 2 })];
const counting = (total: string, part: Partial<Counting> = {}): Counting => ({
  total,
  lines: {},
  serials: {},
  ...part,
});

test('all are there: no line need be counted', () =>
  expect(countOf(counting(' 20 '), two, 20)).toEqual({ total: 20 }));

test.each([
  ['no number', 'a few', 'Enter a whole number of pieces.'],
  ['more than were sent', '21', 'The traveller says 20.'],
  ['none', '0', 'Report trouble'],
])('%s is not right yet', (_, total, says) =>
  expect(countOf(counting(total), two, 20)).toEqual({ notYet: expect.stringContaining(says) as string }),
);

test('fewer: the lines must add up to what was counted', () => {
  expect(countOf(counting('19', { lines: { b: '9' } }), two, 20)).toEqual({
    total: 19,
    counts: [
      { lineId: 'a', pieces: 10 },
      { lineId: 'b', pieces: 9 },
    ],
  });
  expect(countOf(counting('19'), two, 20)).toEqual({
    notYet: 'The lines add up to 20, you counted 19. Change the line where some are missing.',
  });
  expect(countOf(counting('19', { lines: { b: '8' } }), two, 20)).toEqual({
    notYet: 'The lines add up to 18, you counted 19. Change the line where there are more.',
  });
});

test('no line may have more than is on its way', () =>
  expect(countOf(counting('19', { lines: { a: '11', b: '8' } }), two, 20)).toEqual({
    notYet: 'Line 1: enter 10 or less.',
  }));

test('the only line takes the total', () =>
  expect(countOf(counting('9'), [line({ id: 'a' })], 10)).toEqual({
    total: 9,
    counts: [{ lineId: 'a', pieces: 9 }],
  }));

test('of named pieces the names are counted', () =>
  expect(
    countOf(
      counting('1', { serials: { a: ['02'] } }),
      [line({ id: 'a', serials: ['01', '02'], onTheWay: 2 })],
      2,
    ),
  ).toEqual({ total: 1, counts: [{ lineId: 'a', pieces: 1, serials: ['02'] }] }));

test('a line of which nothing is on its way is not asked for', () =>
  expect(
    countOf(counting('9', { lines: { a: '9' } }), [line({ id: 'a' }), line({ id: 'b', onTheWay: 0 })], 10),
  ).toEqual({
    total: 9,
    counts: [{ lineId: 'a', pieces: 9 }],
  }));
