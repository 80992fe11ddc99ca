import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { keepFile } from '@/db/seed/keep-file';
import { intake } from '@/db/schema/readings';
import { getCertificate } from '@/lib/certificates/get-certificate';
import { getCertificateReading } from '@/lib/readings/get-certificate-reading';
import { listIntake } from '@/lib/readings/list-intake';
import { readIntakeAgain } from '@/lib/readings/read-intake-again';
import { addToIntake, assignIntake, setAsideIntake } from '@/lib/readings/settle-intake';

import { makeBatch, makeDispatchedBatch } from '../../factories/batches';
import { makeFile } from '../../factories/evidence';
import { certificatePaper, HEAT_TREAT, makePaperWorld, readAll, stackOf } from '../../factories/papers';
import { lastAudit } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

const sentBatch = (world: World) =>
  world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId, { requirements: HEAT_TREAT }));

const add = (world: World, fileId: string) => world.as(['office'], (ctx) => addToIntake(ctx, { fileId }));
const listed = (world: World) => world.as(['inspector'], async (ctx) => (await listIntake(ctx)).rows);

/** A paper for the second of two batches came in without saying for which. */
async function setup() {
  const world = await makePaperWorld(base);
  const [other, batch] = [await sentBatch(world), await sentBatch(world)];
  const content = await certificatePaper(world, batch.id);
  const fileId = await world.as(['office'], (ctx) =>
    keepFile(ctx, { purpose: 'certificate', name: 'scan.pdf', mediaType: 'application/pdf', content }),
  );
  const { id: intakeId } = await add(world, fileId);
  return { world, other, batch, fileId, intakeId };
}

const assign = (world: World, intakeId: string, batchId: string) =>
  world.as(['inspector'], (ctx) => assignIntake(ctx, { intakeId, batchId }));

const REASON = 'A copy of a paper of another yard.';

test('a paper waits, is read, and its batch is named with what speaks for it', async () => {
  const { world, batch, intakeId } = await setup();
  expect(await listed(world)).toMatchObject([
    { id: intakeId, fileName: 'scan.pdf', addedBy: 'Test Person', state: 'waiting', candidates: [] },
  ]);
  await readAll(base);
  const [row] = await listed(world);
  expect(row).toMatchObject({
    state: 'read',
    processor: 'Alder Ridge Heat Treating',
    number: '26-00417',
    order: 'TP-0002',
  });
  expect(row?.candidates[0]).toMatchObject({
    batchId: batch.id,
    isClear: true,
    reasons: expect.arrayContaining(['It names order TP-0002.']) as unknown,
  });
  expect(row?.candidates.slice(1).filter(({ isClear }) => isClear)).toEqual([]);
});

test('of a file with two certificates both batches are named, and the rest is offered where one was proved', async () => {
  const world = await makePaperWorld(base);
  const [one, two] = [await sentBatch(world), await sentBatch(world)];
  const content = await stackOf([
    await certificatePaper(world, one.id, { number: '26-00501' }),
    await certificatePaper(world, two.id, { number: '26-00502' }),
  ]);
  const fileId = await world.as(['office'], (ctx) =>
    keepFile(ctx, { purpose: 'certificate', name: 'stack.pdf', mediaType: 'application/pdf', content }),
  );
  const { id: intakeId } = await add(world, fileId);
  await readAll(base);
  expect((await listed(world))[0]?.candidates).toMatchObject([
    {
      batchId: one.id,
      isClear: true,
      reasons: expect.arrayContaining(['26-00501: It names order TP-0001.']) as unknown,
    },
    {
      batchId: two.id,
      isClear: true,
      reasons: expect.arrayContaining(['26-00502: It names order TP-0002.']) as unknown,
    },
  ]);
  const { certificateId } = await assign(world, intakeId, two.id);
  expect(await world.as(['inspector'], (ctx) => getCertificateReading(ctx, { certificateId }))).toMatchObject(
    {
      certificateNumber: '26-00502',
      discrepancies: [],
      inFile: [
        { number: '26-00501', taken: [], fits: [{ batchId: one.id, isClear: true }] },
        { number: '26-00502', isThis: true },
      ],
    },
  );
});

test('assigned, it is a certificate of that batch with its reading, and is gone from the list', async () => {
  const { world, batch, fileId, intakeId } = await setup();
  await readAll(base);
  const { certificateId } = await assign(world, intakeId, batch.id);
  expect(await listed(world)).toEqual([]);
  await world.as(['inspector'], async (ctx) => {
    expect(await getCertificate(ctx, { certificateId })).toMatchObject({
      batch: { id: batch.id },
      file: { id: fileId, verified: true },
      certificate: { sentBy: 'Test Person', state: 'waiting' },
    });
    expect(await getCertificateReading(ctx, { certificateId })).toMatchObject({
      state: 'read',
      certificateNumber: '26-00417',
      lines: [{ lineNo: 1, pieces: 10 }],
      discrepancies: [],
    });
    expect(await lastAudit(ctx, 'certificate.add')).toMatchObject({
      entityId: certificateId,
      after: { batchId: batch.id, intakeId },
    });
  });
});

test('assigned before it was read, it is read as the certificate of its batch', async () => {
  const { world, batch, intakeId } = await setup();
  const { certificateId } = await assign(world, intakeId, batch.id);
  await readAll(base);
  expect(await world.as(['inspector'], (ctx) => getCertificateReading(ctx, { certificateId }))).toMatchObject(
    { state: 'read', certificateNumber: '26-00417' },
  );
});

test('a paper is read again when somebody asks for it; one that is settled is not', async () => {
  const { world, batch, intakeId } = await setup();
  await readAll(base);
  await world.as(['office'], async (ctx) => {
    await readIntakeAgain(ctx, { intakeId });
    expect(await lastAudit(ctx, 'intake.read_again')).toMatchObject({ entityId: intakeId });
  });
  expect(await listed(world)).toMatchObject([{ state: 'waiting' }]);
  await readAll(base);
  expect(await listed(world)).toMatchObject([{ state: 'read', number: '26-00417' }]);
  const again = (who: World, role: 'office' | 'auditor') =>
    who.as([role], (ctx) => readIntakeAgain(ctx, { intakeId }));
  await expect(again(world, 'auditor')).rejects.toMatchObject({ code: 'not_allowed' });
  const stranger = await makeWorld(base.db, base.owner);
  await expect(again(stranger, 'office')).rejects.toMatchObject({ code: 'not_found' });
  await assign(world, intakeId, batch.id);
  await expect(again(world, 'office')).rejects.toMatchObject({ code: 'conflict' });
});

test('settled once: a second hand is told who did it, and nothing changes', async () => {
  const { world, other, batch, intakeId } = await setup();
  await assign(world, intakeId, batch.id);
  const settled = { code: 'conflict', message: 'Test Person has settled this paper already.' };
  await expect(assign(world, intakeId, other.id)).rejects.toMatchObject(settled);
  await expect(
    world.as(['inspector'], (ctx) => setAsideIntake(ctx, { intakeId, reason: REASON })),
  ).rejects.toMatchObject(settled);
  const [kept] = await base.owner.select().from(intake).where(eq(intake.id, intakeId));
  expect(kept).toMatchObject({ batchId: batch.id, setAsideReason: null });
});

test('two at once: one settles it', async () => {
  const { world, other, batch, intakeId } = await setup();
  const outcomes = await Promise.allSettled([
    assign(world, intakeId, batch.id),
    assign(world, intakeId, other.id),
  ]);
  expect(outcomes.map(({ status }) => status).toSorted()).toEqual(['fulfilled', 'rejected']);
});

test('set aside, it is kept with the reason and who, and is gone from the list', async () => {
  const { world, intakeId } = await setup();
  await world.as(['inspector'], (ctx) => setAsideIntake(ctx, { intakeId, reason: REASON }));
  expect(await listed(world)).toEqual([]);
  const [kept] = await base.owner.select().from(intake).where(eq(intake.id, intakeId));
  expect(kept).toMatchObject({ setAsideReason: REASON, settledBy: 'Test Person', batchId: null });
  await world.as(['inspector'], async (ctx) =>
    expect(await lastAudit(ctx, 'intake.set_aside')).toMatchObject({ after: { reason: REASON } }),
  );
});

test('the same file is taken in once; a file of another kind or of a batch is not taken in', async () => {
  const { world, batch, fileId } = await setup();
  await expect(add(world, fileId)).rejects.toMatchObject({
    code: 'conflict',
    message: 'scan.pdf is taken in already and waits for its batch.',
  });
  const [photo, ofBatch] = await world.as(['lead'], async (ctx) => [
    await makeFile(ctx, { purpose: 'photo' }),
    await makeFile(ctx, { purpose: 'certificate', batchId: batch.id }),
  ]);
  await expect(add(world, photo ?? '')).rejects.toMatchObject({ code: 'bad_input' });
  await expect(add(world, ofBatch ?? '')).rejects.toMatchObject({ code: 'bad_input' });
});

test('a batch that has not left takes no paper, and the paper stays', async () => {
  const { world, intakeId } = await setup();
  const building = await world.as(['lead'], (ctx) => makeBatch(ctx, world.processorId));
  await expect(assign(world, intakeId, building.id)).rejects.toMatchObject({ code: 'conflict' });
  expect(await listed(world)).toHaveLength(1);
});

test('another shop sees nothing of it and settles nothing; an auditor looks and touches nothing', async () => {
  const { world, batch, fileId, intakeId } = await setup();
  const stranger = await makeWorld(base.db, base.owner);
  const theirs = await sentBatch(stranger);
  expect(await listed(stranger)).toEqual([]);
  await expect(assign(stranger, intakeId, theirs.id)).rejects.toMatchObject({ code: 'not_found' });
  await expect(
    stranger.as(['inspector'], (ctx) => setAsideIntake(ctx, { intakeId, reason: REASON })),
  ).rejects.toMatchObject({ code: 'not_found' });
  await expect(add(stranger, fileId)).rejects.toMatchObject({ code: 'bad_input' });
  await expect(assign(world, intakeId, theirs.id)).rejects.toMatchObject({ code: 'not_found' });
  await expect(
    world.as(['auditor'], (ctx) => assignIntake(ctx, { intakeId, batchId: batch.id })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  expect(await world.as(['auditor'], async (ctx) => (await listIntake(ctx)).rows)).toHaveLength(1);
});
