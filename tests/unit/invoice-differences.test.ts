import fc from 'fast-check';
import { expect, test } from 'vitest';

import { differencesOf, toPayMinor, type InvoiceLine, type OrderSide } from '@/lib/invoices/differences';
import { numberKey } from '@/lib/evidence/invoice/number-key';

const order: OrderSide = {
  currency: 'USD',
  lotMinimumMinor: 30_000,
  certificationFeeMinor: 1_500,
  lines: [
    { lineId: 'a', lineNo: 1, partNumber: 'P-1', ordered: 16, unitPriceMinor: 620, accepted: 16 },
    { lineId: 'b', lineNo: 2, partNumber: 'P-2', ordered: 10, unitPriceMinor: 620, accepted: 9 },
  ],
};
const pieces = (seq: number, lineId: string | null, count: number, price: number): InvoiceLine => ({
  seq,
  kind: 'pieces',
  lineId,
  description: `line ${seq}`,
  pieces: count,
  unitPriceMinor: price,
  amountMinor: count * price,
});
const charge = (seq: number, kind: InvoiceLine['kind'], amountMinor: number): InvoiceLine => ({
  seq,
  kind,
  lineId: null,
  description: kind,
  pieces: null,
  unitPriceMinor: null,
  amountMinor,
});
const ask = (lines: InvoiceLine[], totalMinor = lines.reduce((sum, line) => sum + line.amountMinor, 0)) =>
  differencesOf(order, { currency: 'USD', totalMinor, lines });

test('accepted pieces at the order price, the papers and what is missing to the minimum agree', () =>
  expect(
    ask([
      pieces(1, 'a', 16, 620),
      pieces(2, 'b', 9, 620),
      charge(3, 'certification', 1_500),
      charge(4, 'lot_minimum', 30_000 - 25 * 620),
    ]),
  ).toEqual([]));

test.each([
  ['one piece that was not accepted', [pieces(1, 'b', 10, 620)], 'quantity_above_accepted:1', 620],
  [
    'a price over the order, on accepted pieces only',
    [pieces(1, 'a', 16, 635)],
    'unit_price_mismatch:1',
    240,
  ],
  ['a line of the order twice', [pieces(1, 'a', 16, 620), pieces(2, 'a', 16, 620)], 'line_twice:2', 16 * 620],
  ['a fee above the agreed one', [charge(1, 'certification', 2_500)], 'fee_not_agreed:1', 1_000],
  [
    'more than is missing to the minimum',
    [pieces(1, 'a', 16, 620), charge(2, 'lot_minimum', 25_000)],
    'lot_minimum_mismatch:2',
    25_000 - (30_000 - 16 * 620),
  ],
  ['freight nobody agreed', [charge(1, 'freight', 1_840)], 'not_on_order:1', 1_840],
])('%s is named with what it is over', (_, lines, key, overMinor) =>
  expect(ask(lines)).toMatchObject([{ key, overMinor }]),
);

test('a total that is not the sum of its lines is named', () =>
  expect(ask([pieces(1, 'a', 16, 620)], 10_000)).toMatchObject([
    { code: 'arithmetic', overMinor: 10_000 - 9_920 },
  ]));

test('another currency stops everything else', () =>
  expect(
    differencesOf(order, { currency: 'CAD', totalMinor: 1, lines: [charge(1, 'other', 5)] }),
  ).toMatchObject([{ code: 'currency_mismatch' }]));

test('withholding every difference never pays more than accepted pieces at the order price, minimum and fee', () =>
  fc.assert(
    fc.property(
      fc.array(fc.tuple(fc.constantFrom('a', 'b'), fc.nat(30), fc.integer({ min: 1, max: 900 })), {
        maxLength: 4,
      }),
      fc.nat(60_000),
      fc.nat(4_000),
      fc.nat(9_000),
      (given, minimum, fee, freight) => {
        const lines = [
          ...given.map(([lineId, count, price], at) => pieces(at + 1, lineId, count, price)),
          charge(8, 'lot_minimum', minimum),
          charge(9, 'certification', fee),
          charge(10, 'freight', freight),
        ];
        const total = lines.reduce((sum, line) => sum + line.amountMinor, 0);
        const paid = toPayMinor(
          total,
          ask(lines).map((one) => one.overMinor),
        );
        const accepted = 16 * 620 + 9 * 620;
        expect(paid).toBeLessThanOrEqual(
          Math.max(accepted, order.lotMinimumMinor) + order.certificationFeeMinor,
        );
      },
    ),
  ));

test.each([
  ['8841', 'INV-8841'],
  ['8841', 'Invoice No. 08841'],
  ['26-0118', '260118'],
  ['A-007', 'a7'],
])('%s and %s are one number', (a, b) => expect(numberKey(a)).toBe(numberKey(b)));

test('different numbers stay different', () => expect(numberKey('8841-1')).not.toBe(numberKey('8841-2')));
