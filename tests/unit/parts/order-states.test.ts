import { expect, test } from 'vitest';

import { PartInput, StepInput } from '@/lib/parts/contract';
import { stepWords } from '@/lib/parts/step-words';
import { orderStatesOf } from '@/lib/travellers/order-states';

test('what holds for all lines is said once without them, what differs names its lines', () =>
  expect(
    orderStatesOf([
      { lineNo: 1, ordering: { colour: 'clear', next_step: 'primer' } },
      { lineNo: 2, ordering: { colour: 'clear' } },
      { lineNo: 4, ordering: { colour: 'clear', next_step: ' ' } },
    ]),
  ).toEqual([
    { item: 'colour', says: 'clear', lines: [] },
    { item: 'what comes next', says: 'primer', lines: [1] },
  ]));

test('lines frozen before anybody asked state nothing', () =>
  expect(orderStatesOf([{ lineNo: 1 }])).toEqual([]));

const STEP = { process: 'anodize', specification: 'MIL-PRF-8625', ordering: { colour: 'clear' } };

test('the history says what the order states', () => {
  const step = StepInput.parse(STEP);
  expect(stepWords({ ...step }, 0)).toContain('states colour: clear');
});

test.each([[{ flavour: 'mint' }], [{ colour: 'x'.repeat(201) }]])(
  '%o is refused at its field',
  (ordering) => {
    const parsed = PartInput.shape.route.safeParse([{ ...STEP, ordering }]);
    expect(parsed.error?.issues[0]?.path.slice(0, 2)).toEqual([0, 'ordering']);
  },
);
