import { expect, test } from 'vitest';

import { linesOf, undecidedAlike } from '@/components/certificates/alike';
import { stillCoverable } from '@/components/certificates/still-coverable';
import type { ProvedRequirement } from '@/lib/certificates/contract';

const asked = (lineNo: number | null, part: Partial<ProvedRequirement> = {}): ProvedRequirement => ({
  id: `r${lineNo ?? 0}`,
  lineId: lineNo === null ? null : `l${lineNo}`,
  lineNo,
  characteristic: 'Hardness',
  limit: '84 or more',
  unit: 'HRB',
  source: 'specification',
  sourceText: '',
  decision: null,
  ...part,
});
const decided = { decision: {} as NonNullable<ProvedRequirement['decision']> };

test('the same thing asked of another line is alike; decided, of another limit or of the batch it is not', () => {
  const all = [
    asked(1),
    asked(2),
    asked(3, decided),
    asked(4, { limit: '80 or more' }),
    asked(5, { unit: 'HRC' }),
    asked(6, { characteristic: 'Conductivity' }),
    asked(null),
  ];
  expect(undecidedAlike(asked(1), all).map((one) => one.id)).toEqual(['r2']);
  expect(undecidedAlike(asked(null), all)).toEqual([]);
});

test.each([
  [[2, 1], 'lines 1 and 2'],
  [[1, 2, 3], 'lines 1, 2 and 3'],
  [[1, 2, 3, 4, 5], 'all 5 lines'],
])('%j in words', (numbers, says) => expect(linesOf(numbers.map((lineNo) => ({ lineNo })))).toBe(says));

test('what was entered is kept while it can be covered still', () =>
  expect(
    stillCoverable({ a: 4, b: 4, c: null, gone: 1 }, [
      { id: 'a', coverable: 4 },
      { id: 'b', coverable: 3 },
      { id: 'c', coverable: 3 },
    ]),
  ).toEqual({ a: 4 }));
