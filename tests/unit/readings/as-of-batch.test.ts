import { describe, expect, test } from 'vitest';

import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import type { Order } from '@/lib/evidence/order';
import { asOfBatch } from '@/lib/readings/as-of-batch';
import { ownPlace } from '@/lib/readings/own-place';
import { rowsOn } from '@/lib/readings/rows-on';
import { speaksOf } from '@/lib/readings/speaks-of';

import { NOTHING_STATED } from './nothing-stated';

const row = (part_number: string, lot: string | null = null) => ({
  part_number,
  rev: 'A',
  qty_accepted: 10,
  qty_rejected: null,
  material: null,
  lot,
});

const order = (at: number, parts: readonly string[], lot: string | null = null): Order => ({
  batch: `B-${at}`,
  po: `TP-000${at}`,
  processor: { name: 'Alder Ridge Heat Treating' },
  process: 'solution_heat_treat_and_age',
  requirements: {},
  lines: parts.map((part_number, line) => ({ line: line + 1, part_number, rev: 'A', qty: 10, lot })),
});

const stated = (given: Partial<StatedCertificate>): StatedCertificate => ({
  ...NOTHING_STATED,
  processor: 'Alder Ridge Heat Treating',
  ...given,
});

const fact = (field: string) => ({
  field,
  value: 1,
  raw: '1',
  page: 1,
  box: [0, 0, 1, 1] as [number, number, number, number],
  confidence: 1,
});

const [ONE, TWO] = [order(1, ['MC-1101']), order(2, ['MC-2202'])];
const BOTH = stated({
  purchase_order: 'TP-0001',
  batch: 'B-1',
  lines: [row('MC-1101'), row('MC-2202')],
  facts: ['purchase_order', 'lines[0].qty_accepted', 'lines[1].qty_accepted', 'qty_total'].map(fact),
});

describe('rows of an order', () => {
  test.each([
    ['under its number', row('MC-1101'), [0]],
    ['under its number with the revision behind it', row('MC-1101A'), [0]],
    ['with O for 0', row('MC-11O1'), [0]],
    ['of its lot', row('MC-1101', 'Lot L-7'), [0]],
    ['of another lot', row('MC-1101', 'L-8'), []],
    ['under another number', row('MC-1110'), []],
  ])('%s', (_, line, rows) =>
    expect(rowsOn(stated({ lines: [line] }), order(1, ['MC-1101'], 'L-7'))).toEqual(rows),
  );
});

describe('a certificate for two batches, as far as it speaks of one', () => {
  const as = (words: string[]) => asOfBatch(BOTH, { order: TWO, others: [ONE], words });

  test('has the rows of this one, counted anew, and no sum of the whole paper', () => {
    const { lines, facts } = as([]);
    expect(lines.map(({ part_number }) => part_number)).toEqual(['MC-2202']);
    expect(facts.map(({ field }) => field)).toEqual([
      'purchase_order',
      'other_batch[0].qty_accepted',
      'lines[0].qty_accepted',
      'whole_paper.qty_total',
    ]);
  });

  test('is under this order where its number stands on the page, and under the other where it does not', () => {
    expect(as(['TP-0001,TP-0002'])).toMatchObject({ purchase_order: 'TP-0002', batch: null });
    expect(as(['TP-0001'])).toMatchObject({ purchase_order: 'TP-0001', batch: 'B-1' });
  });

  test('keeps everything where it lists nothing of this batch, and where no other has a row on it', () => {
    const third = order(3, ['MC-3303']);
    expect(asOfBatch(BOTH, { order: third, others: [ONE, TWO], words: [] })).toBe(BOTH);
    expect(asOfBatch(BOTH, { order: ONE, others: [third], words: [] })).toBe(BOTH);
  });
});

describe('what a certificate speaks of', () => {
  const spoken = (one: StatedCertificate, orders: Order[]) =>
    speaksOf(one, orders, { isRecognised: false }).map(({ order: { po }, isClear }) => [po, isClear]);

  test('the order that it names, and the one whose parts it lists besides', () =>
    expect(spoken(BOTH, [ONE, TWO, order(3, ['MC-3303'])])).toEqual([
      ['TP-0001', true],
      ['TP-0002', true],
    ]));

  test('not another order for the same parts', () =>
    expect(
      spoken(stated({ purchase_order: 'TP-0001', lines: [row('MC-1101')] }), [ONE, order(3, ['MC-1101'])]),
    ).toEqual([['TP-0001', true]]));

  test('of two orders for the same parts neither for certain, where it names none', () =>
    expect(spoken(stated({ lines: [row('MC-1101')] }), [ONE, order(3, ['MC-1101'])])).toEqual([
      ['TP-0001', false],
      ['TP-0003', false],
    ]));

  test('that of its lot, where two orders are for the same part', () =>
    expect(
      spoken(stated({ lines: [row('MC-1101', 'L-7')] }), [
        order(1, ['MC-1101'], 'L-6'),
        order(3, ['MC-1101'], 'L-7'),
      ]),
    ).toEqual([['TP-0003', true]]));
});

test.each([
  ['the one that a person named', 0, 0],
  ['the one that speaks of the batch, where nobody named one', null, 1],
  ['the one that speaks of the batch, where the one named is not there any more', 7, 1],
])('of two certificates in a file %s stands for the batch', (_, place, at) => {
  const read = [stated({ lines: [row('MC-1101')] }), stated({ lines: [row('MC-2202')] })];
  expect(ownPlace(read, { place, order: TWO })).toBe(at);
});
