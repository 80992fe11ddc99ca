import { expect, test } from 'vitest';

import { contentsWords } from '@/lib/parts/contents-words';

test.each([
  [41, ['Chine angle'], '41 chine angles'],
  [1, ['Chine angle'], '1 chine angle'],
  [16, ['Strut bolt, 1/2 inch'], '16 strut bolts, 1/2 inch'],
  [2, ['Bulkhead web, station 40'], '2 bulkhead webs, station 40'],
  [6, ['Drain bush'], '6 drain bushes'],
  [3, ['Float assembly'], '3 float assemblies'],
  [4, ['Relay tray'], '4 relay trays'],
  [60, ['Chine angle', 'Drain bush', 'Relay tray'], '60 pieces of 3 parts'],
  [1_250, ['Clip'], '1,250 clips'],
  [0, [], 'nothing yet'],
])('%i of %j', (pieces, parts, says) => {
  expect(contentsWords(pieces, parts)).toBe(says);
});
