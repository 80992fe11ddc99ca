import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { auditEntries } from '@/db/schema/audit';
import { LotInput } from '@/lib/lots/contract';
import { createLot } from '@/lib/lots/create-lot';
import { editLot } from '@/lib/lots/edit-lot';
import { RawRow } from '@/lib/lots/import-row';
import { checkLotImport, importLots } from '@/lib/lots/import-lots';
import { getLot, listLots, listMovements } from '@/lib/lots/queries';
import { newId } from '@/lib/ids';
import { movePieces } from '@/lib/stock/move-pieces';

import { makePart } from '../../factories/lots';
import { somePdf, uploadFile } from '../../factories/uploads';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

async function setup(given: Parameters<typeof makePart>[1] = {}) {
  const world = await makeWorld(base.db, base.owner);
  const part = await world.as(['lead'], (ctx) => makePart(ctx, given));
  return { world, part };
}

const create = (world: World, input: object) =>
  world.as(['lead'], (ctx) => createLot(ctx, LotInput.parse(input)));
const lotsOf = (world: World) => world.as(['auditor'], (ctx) => listLots(ctx, { limit: 50 }));

test('a lot has its pieces waiting for the first step, the next number, and an entry in the audit', async () => {
  const { world, part } = await setup({ processes: ['solution_heat_treat', 'anodize'] });
  const made = await create(world, { partId: part.id, heat: '47-2210', pieces: 14 });
  expect(made).toMatchObject({ number: 'L-0001', version: 1 });
  const lot = await world.as(['auditor'], (ctx) => getLot(ctx, { lotId: made.id }));
  expect(lot).toMatchObject({
    number: 'L-0001',
    heat: '47-2210',
    made: 14,
    madeOn: new Date('2026-06-17T12:00:00Z'),
    route: [{ seq: 1 }, { seq: 2 }],
    named: [],
    batches: [],
    millCertificate: null,
  });
  expect(lot.whereabouts).toEqual([
    {
      place: 'making',
      pieces: 14,
      holder: { kind: 'step', id: part.stepIds[0], says: 'solution_heat_treat', seq: 1, stage: null },
    },
  ]);
  const audit = await world.as(['admin'], ({ tx }) =>
    tx
      .select({ action: auditEntries.action, after: auditEntries.after })
      .from(auditEntries)
      .where(eq(auditEntries.entityId, made.id)),
  );
  expect(audit).toMatchObject([{ action: 'lot.create', after: { number: 'L-0001', pieces: 14 } }]);
});

test('the ledger of a lot names what held its pieces', async () => {
  const { world, part } = await setup();
  const { id } = await create(world, { partId: part.id, heat: 'H-1', pieces: 14 });
  await world.as(['lead'], (ctx) =>
    movePieces(ctx, {
      lotId: id,
      pieces: 4,
      from: { place: 'making', holderId: part.stepIds[0] ?? '' },
      to: { place: 'scrapped', holderId: '00000000-0000-0000-0000-000000000000' },
      reason: 'scrapped',
      note: 'cracked in the brake',
    }),
  );
  const { rows, next } = await world.as(['lead'], (ctx) => listMovements(ctx, { lotId: id, limit: 50 }));
  expect(next).toBeNull();
  expect(rows).toMatchObject([
    {
      pieces: 4,
      reason: 'scrapped',
      note: 'cracked in the brake',
      from: { place: 'making', holder: { kind: 'step' } },
      to: { place: 'scrapped', holder: null },
    },
    { pieces: 14, reason: 'made', from: null, to: { place: 'making' } },
  ]);
});

test('named pieces are each listed, and each has its place', async () => {
  const { world, part } = await setup({ serialised: true });
  const { id } = await create(world, { partId: part.id, heat: 'H-1', serials: ['S-2', 'S-1'] });
  const lot = await world.as(['lead'], (ctx) => getLot(ctx, { lotId: id }));
  expect(lot.named).toMatchObject([
    { serial: 'S-1', place: 'making' },
    { serial: 'S-2', place: 'making' },
  ]);
  expect(
    (await world.as(['lead'], (ctx) => listMovements(ctx, { lotId: id, limit: 5 }))).rows[0]?.serials,
  ).toEqual(['S-1', 'S-2']);
});

test.each([
  ['no pieces', { heat: 'H' }, false, 'pieces'],
  ['serials where pieces have none', { heat: 'H', pieces: 2, serials: ['a', 'b'] }, false, 'serials'],
  ['no serials where each piece has one', { heat: 'H', pieces: 2 }, true, 'serials'],
  ['a serial twice', { heat: 'H', serials: ['a', 'a'] }, true, 'serials'],
  ['another count than serials', { heat: 'H', pieces: 3, serials: ['a', 'b'] }, true, 'serials'],
])('%s is refused beside its field', async (_what, input, serialised, field) => {
  const { world, part } = await setup({ serialised });
  await expect(create(world, { ...input, partId: part.id })).rejects.toMatchObject({
    code: 'bad_input',
    details: { fields: [{ field }] },
  });
});

test.each([
  [{ heat: '' }, 'heat'],
  [{ heat: 'H', pieces: 0 }, 'pieces'],
  [{ heat: 'H', pieces: 1.5 }, 'pieces'],
  [{ heat: 'H', pieces: 2_000_000 }, 'pieces'],
  [{ heat: 'H', madeOn: '16.4.' }, 'madeOn'],
])('%j names the field', (input, field) =>
  expect(LotInput.safeParse({ partId: newId(), ...input }).error?.issues[0]?.path[0]).toBe(field),
);

test('a part without a route has no place where pieces would wait', async () => {
  const { world, part } = await setup({ processes: [] });
  await expect(create(world, { partId: part.id, heat: 'H', pieces: 1 })).rejects.toMatchObject({
    details: { fields: [{ field: 'partId' }] },
  });
});

test('a number that was given by hand is never given again', async () => {
  const { world, part } = await setup();
  await create(world, { partId: part.id, heat: 'H', pieces: 1, number: 'L-0001' });
  expect(await create(world, { partId: part.id, heat: 'H', pieces: 1 })).toMatchObject({ number: 'L-0002' });
  await expect(
    create(world, { partId: part.id, heat: 'H', pieces: 1, number: 'L-0001' }),
  ).rejects.toMatchObject({ details: { fields: [{ field: 'number' }] } });
});

test('not permitted, and another shop', async () => {
  const { world, part } = await setup();
  await expect(
    world.as(['office'], (ctx) => createLot(ctx, LotInput.parse({ partId: part.id, heat: 'H', pieces: 1 }))),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  const { id } = await create(world, { partId: part.id, heat: 'H', pieces: 1 });
  const { world: stranger } = await setup();
  await expect(create(stranger, { partId: part.id, heat: 'H', pieces: 1 })).rejects.toMatchObject({
    code: 'bad_input',
  });
  await expect(stranger.as(['lead'], (ctx) => getLot(ctx, { lotId: id }))).rejects.toMatchObject({
    code: 'not_found',
  });
  await expect(
    stranger.as(['lead'], (ctx) =>
      editLot(ctx, { lotId: id, version: 1, heat: 'X', note: '', millCertificateFileId: null }),
    ),
  ).rejects.toMatchObject({ code: 'not_found' });
  expect((await stranger.as(['lead'], (ctx) => listMovements(ctx, { lotId: id, limit: 5 }))).rows).toEqual(
    [],
  );
});

test('a lot gets its mill certificate later; who saves over another is told', async () => {
  const { world, part } = await setup();
  const { id } = await create(world, { partId: part.id, heat: 'H', pieces: 1 });
  const now = new Date();
  const millCertificateFileId = await uploadFile((work) => world.as(['lead'], work, now), {
    purpose: 'mill_certificate',
    name: 'heat 47.pdf',
    content: somePdf(newId()),
  });
  await world.as(['lead'], (ctx) =>
    editLot(ctx, { lotId: id, version: 1, heat: 'H', note: '', millCertificateFileId }),
  );
  expect((await world.as(['lead'], (ctx) => getLot(ctx, { lotId: id }))).millCertificate).toMatchObject({
    id: millCertificateFileId,
  });
  await expect(
    world.as(['lead'], (ctx) =>
      editLot(ctx, { lotId: id, version: 1, heat: 'Z', note: '', millCertificateFileId }),
    ),
  ).rejects.toMatchObject({ code: 'conflict' });
});

test('lots are found by number, part and heat, and by where their pieces are', async () => {
  const { world, part } = await setup();
  const first = await create(world, { partId: part.id, heat: 'A-1', pieces: 4 });
  await create(world, { partId: part.id, heat: 'B-1', pieces: 4 });
  await world.as(['lead'], (ctx) =>
    movePieces(ctx, {
      lotId: first.id,
      pieces: 4,
      from: { place: 'making', holderId: part.stepIds[0] ?? '' },
      to: { place: 'stock', holderId: newId() },
      reason: 'released',
    }),
  );
  const read = async (input: object) =>
    (await world.as(['lead'], (ctx) => listLots(ctx, { limit: 50, ...input }))).rows.map(
      ({ number }) => number,
    );
  expect(await read({})).toEqual(['L-0002', 'L-0001']);
  expect(await read({ text: '1' })).toEqual(['L-0001']);
  expect(await read({ text: 'b-' })).toEqual(['L-0002']);
  expect(await read({ text: part.number })).toHaveLength(2);
  expect(await read({ where: 'stock' })).toEqual(['L-0001']);
  expect(await read({ where: 'away' })).toEqual([]);
  const page = await world.as(['lead'], (ctx) => listLots(ctx, { limit: 1 }));
  expect(await read({ after: page.next })).toEqual(['L-0001']);
});

const row = (cells: object): RawRow => RawRow.parse(cells);

test('a clean import adds all its lots in one go', async () => {
  const { world, part } = await setup();
  const serialised = await world.as(['lead'], (ctx) => makePart(ctx, { serialised: true }));
  const rows = [
    row({ part: part.number, heat: 'H-1', pieces: '14', madeOn: '2026-06-01' }),
    row({
      part: part.number,
      revision: 'A',
      heat: 'H-2',
      pieces: '3',
      lot: 'OLD-7',
      note: 'from the old book',
    }),
    row({ part: serialised.number, heat: 'H-3', serials: 'S-1; S-2' }),
  ];
  expect(await world.as(['lead'], (ctx) => checkLotImport(ctx, { rows }))).toMatchObject({ isClean: true });
  expect((await lotsOf(world)).rows).toHaveLength(0);
  expect(await world.as(['lead'], (ctx) => importLots(ctx, { rows }))).toMatchObject({
    pieces: 19,
    lots: [{ number: 'L-0001' }, { number: 'OLD-7' }, { number: 'L-0002' }],
  });
  expect((await lotsOf(world)).rows.map(({ number, made }) => [number, made])).toEqual([
    ['L-0002', 2],
    ['OLD-7', 3],
    ['L-0001', 14],
  ]);
});

test('one wrong row, and nothing is imported; each fault is named in its row', async () => {
  const { world, part } = await setup();
  const serialised = await world.as(['lead'], (ctx) => makePart(ctx, { serialised: true }));
  await create(world, { partId: part.id, heat: 'H', pieces: 1, number: 'TAKEN' });
  const good = { part: part.number, heat: 'H', pieces: '1' };
  const rows = [
    row(good),
    row({ ...good, part: 'FL-9' }),
    row({ ...good, revision: 'Q' }),
    row({ ...good, heat: '', pieces: '1.5' }),
    row({ ...good, lot: 'TAKEN' }),
    row({ ...good, lot: 'NEW' }),
    row({ ...good, lot: 'NEW' }),
    row({ ...good, part: serialised.number }),
    row({ ...good, serials: 'S-1' }),
    row({ ...good, madeOn: '1/6/26' }),
  ];
  const checked = await world.as(['lead'], (ctx) => checkLotImport(ctx, { rows }));
  expect(checked.rows.map(({ problems }) => problems.map(({ field }) => field))).toEqual([
    [],
    ['part'],
    ['revision'],
    ['heat', 'pieces'],
    ['lot'],
    [],
    ['lot'],
    ['serials'],
    ['serials'],
    ['madeOn'],
  ]);
  await expect(world.as(['lead'], (ctx) => importLots(ctx, { rows }))).rejects.toMatchObject({
    code: 'bad_input',
    message: expect.stringMatching(/^Nothing is imported: 9 things are wrong/) as string,
    details: {
      fields: expect.arrayContaining([
        { field: 'rows.6.lot', message: 'Row 7: Lot NEW is in row 6 too.' },
      ]) as unknown,
    },
  });
  expect((await lotsOf(world)).rows).toHaveLength(1);
  await expect(
    world.as(['inspector'], (ctx) => importLots(ctx, { rows: [row(good)] })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
});
