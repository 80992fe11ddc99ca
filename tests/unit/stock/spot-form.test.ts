import { expect, test } from 'vitest';

import { SpotForm, typedCount } from '@/components/stock/spot-form';

const typed = (part: Partial<Parameters<typeof SpotForm.safeParse>[0] & object>) => ({
  isNamed: false,
  pieces: '4',
  names: [],
  to: 'a1',
  ...part,
});

test('a number is read, and no names go with it', () =>
  expect(SpotForm.parse(typed({}))).toEqual({ pieces: 4, to: 'a1' }));

test('ticked names are the count, whatever the number says', () =>
  expect(SpotForm.parse(typed({ isNamed: true, pieces: '9', names: ['x', 'y'] }))).toEqual({
    pieces: 2,
    to: 'a1',
    pieceIds: ['x', 'y'],
  }));

test.each([
  ['nothing typed', { pieces: '' }],
  ['words', { pieces: 'four' }],
  ['half a piece', { pieces: '1.5' }],
  ['none', { pieces: '0' }],
  ['no name ticked', { isNamed: true }],
])('%s is a fault of the pieces', (_, part) =>
  expect(SpotForm.safeParse(typed(part)).error?.issues.map((issue) => issue.path)).toEqual([['pieces']]),
);

test('the count as it is typed is null while it is no number', () => {
  expect(typedCount({ isNamed: false, pieces: ' 12 ', names: [] })).toBe(12);
  expect(typedCount({ isNamed: false, pieces: '12x', names: [] })).toBeNull();
  expect(typedCount({ isNamed: true, pieces: '12x', names: ['a'] })).toBe(1);
});
