import fc from 'fast-check';
import { expect, test } from 'vitest';

import type { Difference, InvoiceLine } from '@/lib/invoices/differences';
import { remittanceOf } from '@/lib/invoices/remittance';

const line = (seq: number, amountMinor: number, pieces: number | null = null): InvoiceLine => ({
  seq,
  kind: pieces === null ? 'freight' : 'pieces',
  lineId: null,
  description: `line ${seq}`,
  pieces,
  unitPriceMinor: null,
  amountMinor,
});
const withheld = (
  seq: number | null,
  overMinor: number,
  choice = 'withhold',
): Difference & { clearance: { choice: string } } => ({
  key: `not_on_order:${seq}`,
  code: 'not_on_order',
  seq,
  overMinor,
  sentence: 'Not on the order.',
  clearance: { choice },
});

test('each line stands at what is paid for it, and what is not is named', () =>
  expect(
    remittanceOf({
      lines: [line(1, 6_200, 10), line(2, 2_500), line(3, 1_840)],
      differences: [withheld(1, 620), withheld(2, 2_500), withheld(3, 1_840, 'accept')],
      entries: [{ kind: 'paid', amountMinor: -7_420 }],
      paidMinor: 7_420,
    }),
  ).toEqual({
    lines: [
      { says: 'line 1', pieces: 10, amountMinor: 5_580 },
      { says: 'line 3', pieces: null, amountMinor: 1_840 },
    ],
    withheld: [
      { says: 'Not on the order', amountMinor: 620 },
      { says: 'Not on the order', amountMinor: 2_500 },
    ],
  }));

test('credits and earlier payments are told', () =>
  expect(
    remittanceOf({
      lines: [line(1, 10_000)],
      differences: [],
      entries: [
        { kind: 'credited', amountMinor: -1_000 },
        { kind: 'paid', amountMinor: -6_000 },
        { kind: 'paid', amountMinor: -3_000 },
      ],
      paidMinor: 3_000,
    }).lines,
  ).toMatchObject([
    { amountMinor: 10_000 },
    { says: 'Your credits', amountMinor: -1_000 },
    { says: 'Paid before', amountMinor: -6_000 },
  ]));

test('the lines always add up to what was paid', () =>
  fc.assert(
    fc.property(
      fc.array(fc.nat(90_000), { maxLength: 6 }),
      fc.nat(5_000),
      fc.nat(5_000),
      fc.integer({ min: 1, max: 400_000 }),
      (amounts, credit, off, paidMinor) => {
        const { lines } = remittanceOf({
          lines: amounts.map((amount, at) => line(at + 1, amount)),
          differences: [withheld(1, off), withheld(null, 70)],
          entries: [
            { kind: 'credited', amountMinor: -credit },
            { kind: 'paid', amountMinor: -paidMinor },
          ],
          paidMinor,
        });
        return lines.reduce((sum, one) => sum + one.amountMinor, 0) === paidMinor;
      },
    ),
  ));
