import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { compareInvoice, type InvoiceInput } from '@/lib/evidence/invoice/compare-invoice';
import { INVOICE_CODES, type SeenInvoice, type StatedInvoice } from '@/lib/evidence/invoice/invoice';
import { productMinor } from '@/lib/evidence/invoice/minor';
import { isSameInvoiceNumber } from '@/lib/evidence/invoice/same-invoice-number';
import { Order } from '@/lib/evidence/order';

import { heatTreat } from '../compare/agreeing-certificate';

const ORDER = Order.parse({
  ...heatTreat(),
  price: { currency: 'USD', unit_price: 2.5, lot_minimum: 100, certification_fee: 10, qty_total: 20 },
});
const ACCEPTED = [
  { part_number: '10-200', qty_accepted: 12 },
  { part_number: '10-311', qty_accepted: 8 },
];
const NO_BANK = { iban: null, account: null, routing: null, swift: null };
const EARLIER: SeenInvoice = {
  invoice_number: 'INV-00099',
  invoice_date: '2026-03-01',
  purchase_order: 'PO-4000',
};

/** 20 pieces at 2.50 are 50.00, filled up to 100.00, with 10.00 for the papers. */
const STATED: StatedInvoice = {
  processor: 'Example Thermal',
  invoice_number: 'INV-00123',
  invoice_date: '2026-03-14',
  purchase_order: 'PO-5001',
  currency: 'USD',
  lines: [
    { part_number: '10-200', qty: 12, unit_price: 2.5, amount: 30 },
    { part_number: '10-311', qty: 8, unit_price: 2.5, amount: 20 },
  ],
  lot_minimum_adjustment: 50,
  certification_fee: 10,
  freight: 0,
  tax: 0,
  tax_rate: null,
  other_charges: [],
  subtotal: null,
  total: 110,
  due_date: '2026-04-13',
  bank: NO_BANK,
  facts: [],
};

const codes = (changes: Partial<StatedInvoice>, input: Partial<InvoiceInput> = {}) =>
  compareInvoice({
    stated: { ...STATED, ...changes },
    order: ORDER,
    accepted: ACCEPTED,
    seen: [EARLIER],
    ...input,
  }).map(({ code }) => code);

type Case = [what: string, changes: Partial<StatedInvoice>, input?: Partial<InvoiceInput>];
const [first, second] = STATED.lines;
const withFirst = (changes: object) => ({
  lines: [first, second].flatMap((line, at) => (line ? [at === 0 ? { ...line, ...changes } : line] : [])),
});
const seenAs = (changes: Partial<SeenInvoice>): Partial<InvoiceInput> => ({
  seen: [{ ...EARLIER, purchase_order: 'PO-5001', ...changes }],
});

const PLANTED: Record<string, Case[]> = {
  unit_price_mismatch: [
    ['a higher price', { ...withFirst({ unit_price: 2.6, amount: 31.2 }), total: 111.2 }],
    ['a price that only the amount says', { ...withFirst({ unit_price: null, amount: 31.2 }), total: 111.2 }],
    [
      'with the minimum reckoned from it',
      { ...withFirst({ unit_price: 2.6, amount: 31.2 }), lot_minimum_adjustment: 48.8, total: 110 },
    ],
  ],
  quantity_above_accepted: [
    [
      'more than were accepted',
      {},
      {
        accepted: [
          { part_number: '10-200', qty_accepted: 11 },
          { part_number: '10-311', qty_accepted: 8 },
        ],
      },
    ],
    ['none were accepted', {}, { accepted: ACCEPTED.slice(1) }],
    [
      'more than were ordered',
      { ...withFirst({ qty: 13, amount: 32.5 }), lot_minimum_adjustment: 47.5 },
      { accepted: null },
    ],
    ['the rest twice', {}, seenAs({ lines: [{ part_number: '10-311', qty: 1 }] })],
  ],
  duplicate_invoice: [
    ['the same number', {}, seenAs({ invoice_number: 'INV-00123' })],
    ['in digits', {}, seenAs({ invoice_number: '123' })],
    ['with the year', {}, seenAs({ invoice_number: 'Inv 123/26' })],
    ['with all its pieces', {}, seenAs({ invoice_number: '0123', lines: STATED.lines })],
    [
      'another number for the same work',
      {},
      seenAs({ invoice_number: '123-B', invoice_date: '2026-03-14', total: 110 }),
    ],
  ],
  lot_minimum_mismatch: [
    ['more than is missing', { lot_minimum_adjustment: 60, total: 120 }],
    [
      'where none is agreed',
      {},
      { order: { ...ORDER, price: { currency: 'USD', unit_price: 2.5, certification_fee: 10 } } },
    ],
  ],
  fee_not_agreed: [
    ['more for the papers', { certification_fee: 15, total: 115 }],
    ['a surcharge', { other_charges: [{ description: 'energy surcharge', amount: 4.2 }], total: 114.2 }],
    [
      'freight over its limit',
      { freight: 9, total: 119 },
      { order: { ...ORDER, price: { ...ORDER.price, currency: 'USD', freight: 5 } } as Order },
    ],
  ],
  tax_mismatch: [
    ['with its total', { tax: 9, tax_rate: 8, total: 119 }],
    ['with the total of the right one', { tax: 9, tax_rate: 8, total: 118.8 }],
  ],
  arithmetic: [
    ['a line', { ...withFirst({ amount: 33 }), lot_minimum_adjustment: 47 }],
    ['a line, and the total reckoned rightly', withFirst({ amount: 33 })],
    ['the total', { total: 111 }],
    [
      'thousandths',
      { ...withFirst({ qty: 8, unit_price: 2.5, amount: 20.01 }), lot_minimum_adjustment: 60, total: 110 },
    ],
  ],
  wrong_po: [['', { purchase_order: '5010' }]],
  bank_details_changed: [
    [
      'by an earlier invoice',
      { bank: { ...NO_BANK, iban: 'DE02 1203 0000 0000 2020 51' } },
      seenAs({ facts: [{ field: 'bank_iban', value: 'DE02 1203 0000 0000 2020 52' }] }),
    ],
    [
      'by the order',
      { bank: { ...NO_BANK, account: '4455667' } },
      { order: { ...ORDER, processor: { name: 'Example Thermal', bank: { account: '1122334' } } } },
    ],
  ],
  currency_mismatch: [['', { currency: 'CAD' }]],
  not_on_order: [['', { ...withFirst({ part_number: '99-100' }) }]],
};

describe.each(Object.entries(PLANTED))('%s', (code, cases) => {
  test.each(cases)('%s is found, once and alone', (_, changes, input) => {
    expect(codes(changes, input)).toEqual([code]);
  });
});

test('each code has a case', () =>
  expect(Object.keys(PLANTED).toSorted()).toEqual([...INVOICE_CODES].toSorted()));

test.each<Case>([
  ['as agreed', {}],
  ['without an order', {}, { order: null }],
  ['an order number without its prefix', { purchase_order: '5001' }],
  ['no minimum charged', { lot_minimum_adjustment: 0, total: 60 }],
  ['a fee below the agreed', { certification_fee: 5, total: 105 }],
  ['freight that nobody limited', { freight: 12.5, total: 122.5 }],
  ['tax as printed', { tax: 8.8, tax_rate: 8, total: 118.8 }],
  ['tax of the work alone', { tax: 8, tax_rate: 8, total: 118 }],
  ['fewer pieces, the rest later', { ...withFirst({ qty: 5, amount: 12.5 }), lot_minimum_adjustment: 67.5 }],
  [
    'the first pieces earlier',
    { ...withFirst({ qty: 5, amount: 12.5 }), lot_minimum_adjustment: 67.5 },
    seenAs({ lines: [{ part_number: '10-200', qty: 7 }] }),
  ],
  ['another invoice of the same order', {}, seenAs({ invoice_number: 'INV-00124', total: 50 })],
  [
    'the number of another year',
    { invoice_number: '123/26' },
    seenAs({ invoice_number: '123/25', invoice_date: '2025-03-14' }),
  ],
  ["another processor's number", {}, seenAs({ invoice_number: '123', processor: 'Other Works' })],
  [
    'the account as before',
    { bank: { ...NO_BANK, iban: 'DE02120300000000202051' } },
    seenAs({ facts: [{ field: 'bank_iban', value: 'DE02 1203 0000 0000 2020 51' }] }),
  ],
  ['an account for the first time', { bank: { ...NO_BANK, account: '4455667' } }],
  ['what could not be read', { total: null, ...withFirst({ qty: null, unit_price: null, amount: null }) }],
])('%s is no discrepancy', (_, changes, input) => {
  expect(codes(changes, input)).toEqual([]);
});

test.each([
  ['INV-00123', '123', true],
  ['INV-00123', 'Inv 123/26', true],
  ['2026-0123', 'RE 123', true],
  ['Invoice No. 88-41', 'INV8841', true],
  ['123/26', '123/25', false],
  ['A-123', 'B-123', false],
  ['8841-12', '8841', false],
  ['8841-1', '8841-2', false],
])('%s and %s are one number: %s', (one, other, is) => {
  expect(isSameInvoiceNumber(one, other, ['2026-03-14', '2025-03-14'])).toBe(is);
  expect(isSameInvoiceNumber(other, one, ['2026-03-14'])).toBe(is);
});

test('pieces at a price never lose a cent', () =>
  fc.assert(
    fc.property(fc.integer({ min: 0, max: 9999 }), fc.integer({ min: 0, max: 99_999 }), (qty, cents) => {
      expect(productMinor(qty, cents / 100)).toBe(qty * cents);
    }),
  ));
