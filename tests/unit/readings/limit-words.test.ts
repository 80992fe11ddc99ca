import { expect, test } from 'vitest';

import { readLimit } from '@/lib/readings/limit-words';

test.each([
  ['910 to 930', '°F', { scale: null, min: 910, max: 930, unit: '°F' }],
  ['345 to 355 °F', '', { scale: null, min: 345, max: 355, unit: '°F' }],
  ['10 or less', 's', { scale: null, min: null, max: 10, unit: 's' }],
  ['HRB 63 or more', '', { scale: 'HRB', min: 63, max: null, unit: '' }],
  ['HRC 36 to 40', '', { scale: 'HRC', min: 36, max: 40, unit: '' }],
  ['HR15N 78 or more', '', { scale: 'HR15N', min: 78, max: null, unit: '' }],
  ['28.5 to 32.5', '% IACS', { scale: null, min: 28.5, max: 32.5, unit: '% IACS' }],
  ['0.3 mil or more', '', { scale: null, min: 0.3, max: null, unit: 'mil' }],
  ['375 ± 25 °F', '', { scale: null, min: 350, max: 400, unit: '°F' }],
  ['4 or less after plating', 'h', { scale: null, min: null, max: 4, unit: 'h' }],
  ['4', 'h', { scale: null, min: 4, max: 4, unit: 'h' }],
])('the limit %s in %s', (words, unit, limit) => {
  expect(readLimit(words, unit)).toEqual(limit);
});

test.each(['as ordered', 'on the chart', 'panel of this month', ''])('%s is no figure', (words) => {
  expect(readLimit(words, '')).toBeNull();
});
