import { expect, test } from 'vitest';

import { addInvoice, enterInvoice } from '@/lib/invoices/enter-invoice';
import { getInvoiceReading } from '@/lib/invoices/get-invoice-reading';
import { getInvoice } from '@/lib/invoices/queries';
import { readInvoiceAgain } from '@/lib/invoices/read-invoice-again';

import { makeDispatchedBatch } from '../../factories/batches';
import { entering, pieceLine } from '../../factories/invoices';
import { handIn, invoicePaper, makePaperWorld, readAll } from '../../factories/papers';
import { lastAudit } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

/** An invoice over 10 pieces at 5.00 that was handed in and read. */
async function readInvoice(given: Parameters<typeof invoicePaper>[2]) {
  const world = await makePaperWorld(base);
  const batch = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId));
  const content = await invoicePaper(world, batch.id, given);
  const invoiceId = await handIn(world, batch.id, { kind: 'invoice', content });
  await readAll(base);
  return { world, batch, invoiceId };
}

const readingOf = (world: World, invoiceId: string) =>
  world.as(['office'], (ctx) => getInvoiceReading(ctx, { invoiceId }));

test('an invoice is read into the form it is entered in, each line beside the order’s', async () => {
  const { world, invoiceId } = await readInvoice({ freight: '12.50', total: '62.50' });
  const reading = await readingOf(world, invoiceId);
  expect(reading).toMatchObject({
    state: 'read',
    fault: null,
    number: 'INV-8417',
    datedOn: '2026-06-17',
    dueOn: '2026-07-17',
    currency: 'USD',
    totalMinor: 6250,
    lines: [
      { kind: 'pieces', pieces: 10, unitPriceMinor: 500, amountMinor: 5000 },
      { kind: 'freight', amountMinor: 1250 },
    ],
    discrepancies: [],
  });
  expect(reading.lines[0]?.lineId).not.toBeNull();
  expect(reading.lines.map(({ field }) => field)).toEqual(['lines[0]', 'freight']);
  const placed = reading.facts.map(({ field }) => field);
  for (const field of ['invoice_number', 'total', 'lines[0].unit_price', 'freight'])
    expect(placed).toContain(field);
  for (const { box, page } of reading.facts) {
    const on = reading.pages.find(({ number }) => number === page);
    expect(box[2]).toBeLessThanOrEqual(on?.width ?? 0);
    expect(box[3]).toBeLessThanOrEqual(on?.height ?? 0);
  }
});

test('a sum that does not add up and another order’s number are named', async () => {
  const { world, invoiceId } = await readInvoice({ order: 'TP-9999', total: '85.00' });
  const codes = (await readingOf(world, invoiceId)).discrepancies.map(({ code }) => code);
  expect(codes.toSorted()).toEqual(['arithmetic', 'wrong_po']);
});

test('a file that cannot be read says why; another shop is told that there is no such invoice', async () => {
  const world = await makePaperWorld(base);
  const batch = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId));
  const invoiceId = await handIn(world, batch.id, {
    kind: 'invoice',
    content: Buffer.from('<html><body>Invoice</body></html>'),
  });
  expect((await readingOf(world, invoiceId)).state).toBe('waiting');
  await readAll(base);
  expect(await readingOf(world, invoiceId)).toMatchObject({
    state: 'unreadable',
    fault: expect.stringContaining('named .pdf') as string,
    lines: [],
  });
  const stranger = await makeWorld(base.db, base.owner);
  await expect(readingOf(stranger, invoiceId)).rejects.toMatchObject({ code: 'not_found' });
});

test('a second copy of an invoice that was entered for another batch is named', async () => {
  const { world, invoiceId } = await readInvoice({ total: '50.00' });
  await world.as(['office'], async (ctx) => {
    const { order } = await getInvoice(ctx, { invoiceId });
    const lineId = order.lines[0]?.lineId ?? '';
    await enterInvoice(ctx, entering(invoiceId, [pieceLine(lineId, 10, 500)], { number: 'INV-8417' }));
  });
  const other = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId));
  const content = await invoicePaper(world, other.id, { total: '50.00' });
  const copyId = await handIn(world, other.id, { kind: 'invoice', content });
  await readAll(base);
  expect((await readingOf(world, copyId)).discrepancies.map(({ code }) => code)).toEqual([
    'duplicate_invoice',
  ]);
});

test('an invoice is read again when the office asks for it, and the trail says who asked', async () => {
  const { world, invoiceId } = await readInvoice({ total: '50.00' });
  await world.as(['office'], async (ctx) => {
    await readInvoiceAgain(ctx, { invoiceId });
    expect(await lastAudit(ctx, 'invoice.read_again')).toMatchObject({ entityId: invoiceId });
  });
  expect(await readingOf(world, invoiceId)).toMatchObject({ state: 'waiting', number: null });
  expect(await readAll(base)).toBe(1);
  expect(await readingOf(world, invoiceId)).toMatchObject({ state: 'read', number: 'INV-8417' });
});

test('reading an invoice again is refused to an auditor, to another shop, and where there is no file', async () => {
  const { world, batch, invoiceId } = await readInvoice({ total: '50.00' });
  await expect(world.as(['auditor'], (ctx) => readInvoiceAgain(ctx, { invoiceId }))).rejects.toMatchObject({
    code: 'not_allowed',
  });
  const stranger = await makeWorld(base.db, base.owner);
  await expect(stranger.as(['office'], (ctx) => readInvoiceAgain(ctx, { invoiceId }))).rejects.toMatchObject({
    code: 'not_found',
  });
  const { id: typed } = await world.as(['office'], (ctx) =>
    addInvoice(ctx, { batchId: batch.id, fileId: null }),
  );
  await expect(
    world.as(['office'], (ctx) => readInvoiceAgain(ctx, { invoiceId: typed })),
  ).rejects.toMatchObject({ code: 'conflict', message: expect.stringContaining('without a file') as string });
});
