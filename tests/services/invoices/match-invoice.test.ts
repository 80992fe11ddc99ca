import { expect, test } from 'vitest';

import { approveInvoice } from '@/lib/invoices/approve-invoice';
import { clearDifference, undoClearance } from '@/lib/invoices/clear-difference';
import { addInvoice, enterInvoice } from '@/lib/invoices/enter-invoice';
import { getInvoice, listInvoices } from '@/lib/invoices/queries';
import { refuseInvoice } from '@/lib/invoices/refuse-invoice';

import { makeFile, makeSignedCertificate } from '../../factories/evidence';
import { ALL, charge, entering, makeProvedBatch, pieceLine, takeUp } from '../../factories/invoices';
import { lastAudit } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();
const setUp = async (given: Parameters<typeof makeProvedBatch>[2] = {}) => {
  const world = await makeWorld(base.db, base.owner);
  const batch = await makeProvedBatch(world, base.owner, given);
  return { world, batch, ...(await takeUp(world, batch.id)) };
};
const office = <T>(world: World, work: Parameters<World['as']>[1]) =>
  world.as(['office'], work) as Promise<T>;
const stateOf = (world: World, invoiceId: string) =>
  world.as(['auditor'], async (ctx) => (await getInvoice(ctx, { invoiceId })).state);

test('an invoice that agrees is entered, and only approval is left', async () => {
  const { world, invoiceId, lineId } = await setUp();
  expect(await stateOf(world, invoiceId)).toBe('to_enter');
  await office(world, (ctx) =>
    enterInvoice(ctx, entering(invoiceId, [pieceLine(lineId, 10, 500)], { number: '8841' })),
  );
  await world.as(['office'], async (ctx) => {
    expect(await getInvoice(ctx, { invoiceId })).toMatchObject({
      state: 'to_approve',
      toPayMinor: 5_000,
      differences: [],
      number: '8841',
      papers: [{ pieces: 10 }],
    });
    expect(await lastAudit(ctx, 'invoice.enter')).toMatchObject({
      entityId: invoiceId,
      actorName: 'Test Person',
    });
  });
});

test('differences are named, cleared, undone, and approval waits for the last', async () => {
  const { world, invoiceId, lineId } = await setUp({ accepted: 9 });
  await office(world, (ctx) =>
    enterInvoice(ctx, entering(invoiceId, [pieceLine(lineId, 10, 515), charge('freight', 1_840)])),
  );
  const read = () => world.as(['office'], (ctx) => getInvoice(ctx, { invoiceId }));
  expect((await read()).differences.map(({ key, overMinor }) => [key, overMinor])).toEqual([
    ['unit_price_mismatch:1', 9 * 15],
    ['quantity_above_accepted:1', 515],
    ['not_on_order:2', 1_840],
  ]);

  const clear = async (difference: string, choice: 'accept' | 'withhold', reason = '') => {
    const { version } = await read();
    await office(world, (ctx) => clearDifference(ctx, { invoiceId, version, difference, choice, reason }));
  };
  await clear('unit_price_mismatch:1', 'withhold');
  await clear('quantity_above_accepted:1', 'withhold');
  await expect(clear('not_on_order:2', 'accept')).rejects.toMatchObject({
    code: 'bad_input',
    details: { fields: [{ field: 'reason' }] },
  });
  await expect(
    office(world, async (ctx) =>
      approveInvoice(ctx, { invoiceId, version: (await getInvoice(ctx, { invoiceId })).version }),
    ),
  ).rejects.toMatchObject({ code: 'conflict', message: '1 difference is not cleared yet.' });

  await clear('not_on_order:2', 'accept', 'the yard van was ours');
  expect(await read()).toMatchObject({ state: 'to_approve', toPayMinor: 5_150 + 1_840 - 135 - 515 });
  await office(world, async (ctx) =>
    undoClearance(ctx, {
      invoiceId,
      version: (await getInvoice(ctx, { invoiceId })).version,
      difference: 'unit_price_mismatch:1',
    }),
  );
  expect(await read()).toMatchObject({ state: 'to_clear' });
  await clear('unit_price_mismatch:1', 'withhold');
  const { version } = await read();
  await office(world, (ctx) => approveInvoice(ctx, { invoiceId, version }));
  expect(await read()).toMatchObject({
    state: 'to_pay',
    toPayMinor: 6_340,
    balanceMinor: 6_340,
    approved: { by: 'Test Person', byMe: true },
  });
});

test('what was approved stands, whatever is accepted afterwards', async () => {
  const { world, batch, invoiceId, lineId } = await setUp({ accepted: 9 });
  await office(world, (ctx) => enterInvoice(ctx, entering(invoiceId, [pieceLine(lineId, 10, 500)])));
  await office(world, (ctx) =>
    clearDifference(ctx, {
      invoiceId,
      version: 2,
      difference: 'quantity_above_accepted:1',
      choice: 'withhold',
      reason: '',
    }),
  );
  await office(world, (ctx) => approveInvoice(ctx, { invoiceId, version: 3 }));
  await world.as(ALL, (ctx) => makeSignedCertificate(ctx, batch.id, [1]));
  expect(await world.as(['office'], (ctx) => getInvoice(ctx, { invoiceId }))).toMatchObject({
    toPayMinor: 4_500,
    withheldMinor: 500,
    differences: [{ clearance: { choice: 'withhold' } }],
    order: { lines: [{ accepted: 10 }] },
  });
});

test.each([
  ['INV-0088-41', '8841 '],
  ['Inv. 88-41', '0088 41'],
])('the same invoice under another spelling is refused: %s and %s', async (first, second) => {
  const { world, batch, invoiceId, lineId } = await setUp();
  await office(world, (ctx) =>
    enterInvoice(ctx, entering(invoiceId, [pieceLine(lineId, 10, 500)], { number: first })),
  );
  const again = await takeUp(world, batch.id);
  const enter = () =>
    office(world, (ctx) =>
      enterInvoice(ctx, entering(again.invoiceId, [pieceLine(lineId, 10, 500)], { number: second })),
    );
  await expect(enter()).rejects.toMatchObject({
    code: 'conflict',
    details: { fields: [{ field: 'number' }] },
  });

  await office(world, (ctx) =>
    refuseInvoice(ctx, { invoiceId, version: 2, reason: 'asked for a corrected one' }),
  );
  await enter();
  const seen = await world.as(
    ['office'],
    async (ctx) => (await getInvoice(ctx, { invoiceId: again.invoiceId })).seenBefore,
  );
  expect(seen).toMatchObject([{ why: 'same_number', number: first }]);
});

test('the same number twice at the same moment is entered once', async () => {
  const { world, batch, invoiceId, lineId } = await setUp();
  const other = await takeUp(world, batch.id);
  const enter = (id: string) =>
    office(world, (ctx) => enterInvoice(ctx, entering(id, [pieceLine(lineId, 10, 500)], { number: '8841' })));
  const outcomes = await Promise.allSettled([enter(invoiceId), enter(other.invoiceId)]);
  expect(outcomes.filter((one) => one.status === 'fulfilled')).toHaveLength(1);
});

test('an invoice of the same order, with the same total or the same file, is shown as seen before', async () => {
  const { world, batch, invoiceId, lineId } = await setUp();
  const withFile = (content: string) =>
    world.as(['office'], async (ctx) =>
      addInvoice(ctx, {
        batchId: batch.id,
        fileId: await makeFile(ctx, { purpose: 'invoice', batchId: batch.id, content }),
      }),
    );
  const [first, second] = [await withFile('the same bytes'), await withFile('the same bytes')];
  await office(world, (ctx) => enterInvoice(ctx, entering(invoiceId, [pieceLine(lineId, 10, 500)])));
  await office(world, (ctx) => enterInvoice(ctx, entering(first.id, [pieceLine(lineId, 10, 500)])));
  const seen = await world.as(
    ['office'],
    async (ctx) => (await getInvoice(ctx, { invoiceId: first.id })).seenBefore,
  );
  expect(
    seen
      .filter((one) => one.id === invoiceId)
      .map((one) => one.why)
      .sort(),
  ).toEqual(['same_order', 'same_total']);
  expect(
    seen
      .filter((one) => one.id === second.id)
      .map((one) => one.why)
      .sort(),
  ).toEqual(['same_file', 'same_order']);
});

test('two people at once: the second is told that it was changed', async () => {
  const { world, invoiceId, lineId } = await setUp();
  const enter = () =>
    office(world, (ctx) => enterInvoice(ctx, entering(invoiceId, [pieceLine(lineId, 10, 500)])));
  const outcomes = await Promise.allSettled([enter(), enter()]);
  expect(outcomes.map((one) => one.status).sort()).toEqual(['fulfilled', 'rejected']);
  expect(outcomes.find((one) => one.status === 'rejected')).toMatchObject({ reason: { code: 'conflict' } });
});

test('who may: a lead reads, only office and admin enter and approve; another shop is told it does not exist', async () => {
  const [{ world, batch, invoiceId, lineId }, stranger] = [
    await setUp(),
    await makeWorld(base.db, base.owner),
  ];
  const input = entering(invoiceId, [pieceLine(lineId, 10, 500)]);
  await expect(world.as(['lead'], (ctx) => enterInvoice(ctx, input))).rejects.toMatchObject({
    code: 'not_allowed',
  });
  await expect(
    world.as(['auditor'], (ctx) => refuseInvoice(ctx, { invoiceId, version: 1, reason: 'because' })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  await expect(stranger.as(['office'], (ctx) => enterInvoice(ctx, input))).rejects.toMatchObject({
    code: 'not_found',
  });
  await expect(stranger.as(['office'], (ctx) => getInvoice(ctx, { invoiceId }))).rejects.toMatchObject({
    code: 'not_found',
  });
  await expect(
    stranger.as(['office'], (ctx) => addInvoice(ctx, { batchId: batch.id, fileId: null })),
  ).rejects.toMatchObject({ code: 'not_found' });
  expect(await stranger.as(['office'], (ctx) => listInvoices(ctx, { limit: 50, show: 'all' }))).toEqual({
    rows: [],
    next: null,
  });
});

test('a list goes from page to page by key and shows what asks for something first', async () => {
  const { world, batch, invoiceId, lineId } = await setUp();
  const second = await takeUp(world, batch.id);
  await takeUp(world, batch.id);
  await office(world, (ctx) => enterInvoice(ctx, entering(invoiceId, [pieceLine(lineId, 10, 500)])));
  await office(world, (ctx) =>
    refuseInvoice(ctx, { invoiceId: second.invoiceId, version: 1, reason: 'for another shop' }),
  );
  const list = (input: Partial<Parameters<typeof listInvoices>[1]>) =>
    world.as(['auditor'], (ctx) => listInvoices(ctx, { limit: 2, show: 'all', ...input }));
  const first = await list({});
  expect(first.rows.map((row) => row.state)).toEqual(['to_enter', 'refused']);
  expect(await list({ after: first.next ?? '' })).toMatchObject({
    rows: [{ id: invoiceId, state: 'to_approve' }],
    next: null,
  });
  expect((await list({ show: 'open' })).rows.map((row) => row.state)).toEqual(['to_enter', 'to_approve']);
  expect((await list({ show: 'refused' })).rows).toHaveLength(1);
  expect((await list({ show: 'paid' })).rows).toHaveLength(0);
});
