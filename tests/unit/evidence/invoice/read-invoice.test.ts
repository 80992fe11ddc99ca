import { expect, test } from 'vitest';

import { compareInvoice } from '@/lib/evidence/invoice/compare-invoice';
import { readInvoice } from '@/lib/evidence/invoice/read-invoice';
import { openFile } from '@/lib/evidence/open/open-file';

import { WRITTEN } from './written-invoices';
import { american, boxed, european, MAIL } from './invoice-layouts';

const read = async (bytes: Uint8Array, name = 'invoice.pdf') => readInvoice(await openFile(bytes, { name }));

test('an American invoice', async () => {
  expect(await read(await american())).toMatchObject({
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
    tax: 8,
    tax_rate: 8,
    other_charges: [],
    subtotal: 50,
    total: 118,
    due_date: '2026-04-13',
    bank: { routing: '041000124', account: '7788 9900 12', iban: null },
  });
});

test('a European invoice', async () => {
  expect(await read(await european())).toMatchObject({
    invoice_number: '2026-0417',
    invoice_date: '2026-03-14',
    purchase_order: 'PO-5001',
    currency: 'EUR',
    lines: [{ part_number: '10-200', qty: 480, unit_price: 2.5, amount: 1200 }],
    certification_fee: 15,
    tax: 230.85,
    tax_rate: 19,
    subtotal: 1215,
    total: 1445.85,
    due_date: '2026-04-13',
    bank: { iban: 'DE02 1203 0000 0000 2020 51', swift: 'BYLADEM1001' },
  });
});

test('an invoice in the words of a mail', async () => {
  expect(await read(new TextEncoder().encode(MAIL), 'mail.txt')).toMatchObject({
    invoice_number: '88-41',
    invoice_date: '2026-03-14',
    purchase_order: 'PO-5002',
    lines: [{ part_number: '20-777', qty: 40, unit_price: 1.25, amount: 50 }],
    lot_minimum_adjustment: 25,
    certification_fee: 12.5,
    total: 87.5,
    currency: 'USD',
    due_date: '2026-04-13',
  });
});

test('an invoice of boxes, with the part in the description', async () => {
  expect(await read(await boxed())).toMatchObject({
    invoice_number: 'N-7731',
    invoice_date: '2026-03-14',
    purchase_order: '5003',
    lines: [{ part_number: '30-415', qty: 5, unit_price: 20, amount: 100 }],
    other_charges: [{ description: 'Rush charge', amount: 35 }],
    freight: 8,
    total: 143,
    currency: 'GBP',
    due_date: '2026-04-01',
  });
});

test('each fact knows its words and its place', async () => {
  const { facts } = await read(await american());
  const amount = facts.find(({ field }) => field === 'lines[1].amount');
  expect(amount).toMatchObject({ value: 20, page: 1 });
  expect(amount?.raw).toContain('20.00');
  expect(amount?.box[1]).toBeGreaterThan(220);
  expect(amount?.box[3]).toBeLessThan(245);
});

test('a page without an invoice states nothing', async () => {
  expect(await read(new TextEncoder().encode('Thank you for your visit.'), 'note.txt')).toMatchObject({
    invoice_number: null,
    total: null,
    lines: [],
    currency: null,
  });
});

test.each(WRITTEN.map(({ text, truth }) => [text.trim().split('\n')[0]?.trim(), text, truth] as const))(
  'a written invoice that begins %s',
  async (_, text, truth) => {
    const stated = await read(new TextEncoder().encode(text), 'invoice.txt');
    expect(stated).toMatchObject(truth);
    // What is read of an invoice that adds up adds up.
    expect(compareInvoice({ stated, order: null })).toEqual([]);
  },
);
