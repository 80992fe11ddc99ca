import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';

import { ProposedList } from '@/components/batches/proposed-requirements';
import { EMPTY_PART, EMPTY_STEP, type PartValues } from '@/components/parts/part-form-values';
import { askedOf } from '@/components/parts/propose-proofs';

const soak = {
  characteristic: 'Soak',
  limit: '30 to 40',
  unit: 'min',
  source: 'specification' as const,
  sourceText: 'MIL-H-6088G (from memory, medium trust)',
};

test('lines that would be asked the same stand together, each limit with where it stands', () => {
  const lines = [1, 2, 3].map((lineNo) => ({
    lineId: `line-${lineNo}`,
    lineNo,
    proposals: lineNo === 3 ? [{ ...soak, limit: '55 or more' }] : [soak],
  }));
  const seen = renderToStaticMarkup(createElement(ProposedList, { lines })).replace(/<[^>]*>/g, ' ');
  expect(seen).toMatch(/lines 1, 2\s/);
  expect(seen).toMatch(/line 3\s/);
  expect(seen).toContain('30 to 40 min');
  expect(seen).toContain('55 min or more');
  expect(seen).toContain('from memory');
});

test('a step is asked about in the condition in which the pieces come to it', () => {
  const part: PartValues = {
    ...EMPTY_PART,
    alloy: '2024',
    madeCondition: 'O',
    route: [
      { ...EMPTY_STEP, process: 'solution_heat_treat', targetCondition: 'T42' },
      { ...EMPTY_STEP, process: 'artificial_age', targetCondition: 'T62' },
      EMPTY_STEP,
    ],
  };
  expect(askedOf(part, 0, 'inch')).toMatchObject({ conditionBefore: 'O', targetCondition: 'T42' });
  expect(askedOf(part, 1, 'inch')).toMatchObject({ conditionBefore: 'T42', targetCondition: 'T62' });
  expect(askedOf(part, 2, 'inch')).toBeNull();
});
