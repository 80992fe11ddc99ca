import { expect, test } from 'vitest';

import { dateWords, issueReply, standingReply } from '@/components/reference/specification-words';
import { SPECIFICATION_LINEAGE } from '@/lib/trade/tables/specification-lineage';

const asked = (number: string, more: { revision?: string; on?: string } = {}) => ({
  number,
  revision: more.revision ?? null,
  on: more.on ?? '2026-12-01',
  covers: 'parts' as const,
});
const stands = (...of: Parameters<typeof asked>) => standingReply(SPECIFICATION_LINEAGE, asked(...of));

test('a superseded number is said to be so, with its day and what stands in its place at the end', () => {
  expect(stands('MIL-H-6088')).toMatchObject({ good: false, says: 'MIL-H-6088 was superseded in Jul 1997' });
  expect(stands('MIL-H-6088')?.rest).toContain('AMS2770');
});

test('before that day it stood', () => {
  expect(stands('MIL-H-6088', { on: '1995-01-01' })).toMatchObject({
    good: true,
    says: 'MIL-H-6088 was issued on 1 Apr 1991',
  });
});

test('of a number that is not recorded nothing is said', () => {
  expect(stands('AMS9999')).toBeNull();
  expect(issueReply(SPECIFICATION_LINEAGE, asked('AMS9999'))).toBeNull();
});

test('the issue that is named applies, else the one of the order’s day', () => {
  expect(issueReply(SPECIFICATION_LINEAGE, asked('AMS2750', { on: '2021-03-01' }))).toBe(
    'Issue F applies: it was in force.',
  );
  expect(issueReply(SPECIFICATION_LINEAGE, asked('AMS2750', { revision: 'E', on: '2021-03-01' }))).toBe(
    'Issue E applies: it is named.',
  );
});

test.each([
  ['1997', '1997'],
  ['1997-07', 'Jul 1997'],
  ['1997-07-01', '1 Jul 1997'],
])('a date is said as exactly as it is known: %s', (on, says) => expect(dateWords(on)).toBe(says));
