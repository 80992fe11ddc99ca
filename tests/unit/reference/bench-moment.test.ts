import { expect, test } from 'vitest';

import { momentWords, readMoment, spanWords } from '@/components/reference/bench-moment';

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
