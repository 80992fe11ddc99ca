import { expect, test } from 'vitest';

import { scaleStep, stretchesOf } from '@/lib/lots/stair';

test('places lie end to end and end at all that were made', () =>
  expect(
    stretchesOf([{ pieces: 12 }, { pieces: 22 }, { pieces: 7 }]).map(({ from, to }) => [from, to]),
  ).toEqual([
    [0, 12],
    [12, 34],
    [34, 41],
  ]));

test.each([
  [1, 1],
  [10, 1],
  [11, 2],
  [41, 5],
  [60, 10],
  [1000, 100],
  [12_000, 2000],
])('a scale to %i has a number every %i', (to, step) => expect(scaleStep(to)).toBe(step));
