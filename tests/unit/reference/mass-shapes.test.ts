import { expect, test } from 'vitest';

import { shapeOf } from '@/components/reference/mass-shapes';

test('a bar needs two measures, a sheet and a tube three', () => {
  expect(shapeOf('round_bar', [100, 10, null])).toEqual({ form: 'round_bar', lengthMm: 100, diameterMm: 10 });
  expect(shapeOf('tube', [100, 20, 2])).toEqual({
    form: 'tube',
    lengthMm: 100,
    outsideDiameterMm: 20,
    wallMm: 2,
  });
  expect(shapeOf('sheet', [100, 20, null])).toBeNull();
});
