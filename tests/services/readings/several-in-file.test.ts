import { expect, test } from 'vitest';

import { getCertificate } from '@/lib/certificates/get-certificate';
import { setAsideCertificate } from '@/lib/certificates/set-aside-certificate';
import { signCertificate } from '@/lib/certificates/sign-certificate';
import { recordCertificate } from '@/lib/certificates/record-certificate';
import { addFromFile } from '@/lib/readings/add-from-file';
import { correctReading } from '@/lib/readings/correct-reading';
import { getCertificateReading } from '@/lib/readings/get-certificate-reading';

import { makeBatch, makeDispatchedBatch } from '../../factories/batches';
import { countInAll, decideAll, givePassword, signingInput } from '../../factories/evidence';
import {
  certificatePaper,
  handIn,
  HEAT_TREAT,
  makePaperWorld,
  readAll,
  stackOf,
} from '../../factories/papers';
import { lastAudit, stageNow } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

const sentBatch = (world: World, pieces: readonly number[] = [10]) =>
  world.as(['lead'], (ctx) =>
    makeDispatchedBatch(ctx, world.processorId, { requirements: HEAT_TREAT, pieces }),
  );

const readingOf = (world: World, certificateId: string) =>
  world.as(['inspector'], (ctx) => getCertificateReading(ctx, { certificateId }));

const codesOf = async (world: World, certificateId: string) =>
  (await readingOf(world, certificateId)).discrepancies.map(({ code }) => code);

const take = (world: World, certificateId: string, place: number, batchId: string) =>
  world.as(['office'], (ctx) => addFromFile(ctx, { certificateId, place, batchId }));

/** One file with a certificate for each of two batches, handed in for the first. */
async function stackForTwo() {
  const world = await makePaperWorld(base);
  const [one, two] = [await sentBatch(world), await sentBatch(world, [6])];
  const content = await stackOf([
    await certificatePaper(world, one.id, { number: '26-00501' }),
    await certificatePaper(world, two.id, { number: '26-00502' }),
  ]);
  const certificateId = await handIn(world, one.id, { kind: 'certificate', content });
  await readAll(base);
  return { world, one, two, certificateId };
}

/** One batch of 10 pieces whose file holds two certificates: for 6 and for 4 of them. */
async function stackForOne() {
  const world = await makePaperWorld(base);
  await givePassword(base.owner, world.userId);
  const batch = await sentBatch(world);
  const content = await stackOf([
    await certificatePaper(world, batch.id, { number: '26-00501', pieces: [6] }),
    await certificatePaper(world, batch.id, { number: '26-00502', pieces: [4] }),
  ]);
  const certificateId = await handIn(world, batch.id, { kind: 'certificate', content });
  await readAll(base);
  return { world, batch, certificateId };
}

/** One certificate that lists the parts of two batches, handed in for the first. */
async function paperForTwo() {
  const world = await makePaperWorld(base);
  const [one, two] = [await sentBatch(world), await sentBatch(world, [6])];
  const content = await certificatePaper(world, one.id, { number: '26-00501', also: two.id });
  const certificateId = await handIn(world, one.id, { kind: 'certificate', content });
  await readAll(base);
  return { world, one, two, certificateId };
}

test('each certificate of a file is shown with the batch that it belongs to, and is taken up for it', async () => {
  const { world, one, two, certificateId } = await stackForTwo();
  const { certificateNumber, inFile, lines, discrepancies } = await readingOf(world, certificateId);
  expect({ certificateNumber, lines, discrepancies }).toMatchObject({
    certificateNumber: '26-00501',
    lines: [{ lineNo: 1, pieces: 10 }],
    discrepancies: [],
  });
  expect(inFile).toMatchObject([
    { place: 0, number: '26-00501', isThis: true, taken: [{ certificateId, batchId: one.id }], fits: [] },
    {
      place: 1,
      number: '26-00502',
      isThis: false,
      taken: [],
      fits: [
        {
          batchId: two.id,
          isClear: true,
          reasons: expect.arrayContaining(['It names order TP-0002.']) as unknown,
        },
      ],
    },
  ]);

  const { certificateId: second } = await take(world, certificateId, 1, two.id);
  expect(await readingOf(world, second)).toMatchObject({
    state: 'read',
    certificateNumber: '26-00502',
    lines: [{ lineNo: 1, pieces: 6 }],
    discrepancies: [],
    inFile: [
      { isThis: false, taken: [{ certificateId, batchId: one.id }] },
      { isThis: true, taken: [{ certificateId: second, batchId: two.id }], fits: [] },
    ],
  });
  expect(await codesOf(world, certificateId)).toEqual([]);
  await world.as(['inspector'], async (ctx) => {
    expect(await getCertificate(ctx, { certificateId: second })).toMatchObject({
      batch: { id: two.id },
      file: { verified: true },
      sameFile: [],
    });
    expect((await getCertificate(ctx, { certificateId })).sameFile).toEqual([]);
    expect(await lastAudit(ctx, 'certificate.add')).toMatchObject({
      entityId: second,
      after: { batchId: two.id, place: 1, from: certificateId },
    });
  });
});

test('two certificates of one file share a line: their pieces add up, and each is signed for its own', async () => {
  const { world, batch, certificateId } = await stackForOne();
  const { certificateId: second } = await take(world, certificateId, 1, batch.id);
  for (const [id, pieces] of [
    [certificateId, 6],
    [second, 4],
  ] as const)
    expect(await readingOf(world, id)).toMatchObject({
      lines: [
        {
          lineNo: 1,
          pieces,
          why: `All 10 pieces are accounted for: ${pieces} accepted here and ${10 - pieces} on another certificate.`,
        },
      ],
      discrepancies: [],
    });
  await world.as(['lead'], (ctx) => countInAll(ctx, batch.id, [{ good: 10 }]));
  for (const [id, pieces] of [
    [certificateId, 6],
    [second, 4],
  ] as const)
    await world.as(['inspector'], async (ctx) => {
      await recordCertificate(ctx, {
        certificateId: id,
        version: 1,
        number: `26-${pieces}`,
        datedOn: '2026-06-17',
      });
      await decideAll(ctx, id);
      await signCertificate(ctx, await signingInput(ctx, id, [pieces]));
    });
  await world.as(['inspector'], async (ctx) => {
    expect((await getCertificate(ctx, { certificateId })).lines).toMatchObject([
      { covered: 10, coverable: 0, here: 6, elsewhere: [{ certificateId: second, pieces: 4 }] },
    ]);
    expect(await stageNow(ctx, batch.id)).toBe('proved');
  });
});

test('a part of the pieces leaves the balance open, also where the rest stands on a paper that was set aside', async () => {
  const { world, batch, certificateId } = await stackForOne();
  const { certificateId: second } = await take(world, certificateId, 1, batch.id);
  await world.as(['inspector'], (ctx) =>
    setAsideCertificate(ctx, { certificateId: second, version: 1, reason: 'A corrected one is promised.' }),
  );
  expect((await readingOf(world, certificateId)).discrepancies).toMatchObject([
    {
      code: 'quantity_mismatch',
      severity: 'check',
      message: expect.stringContaining('balance open') as string,
    },
  ]);
});

test('one certificate for two batches is taken up for each, with its own lines', async () => {
  const { world, one, two, certificateId } = await paperForTwo();
  expect((await readingOf(world, certificateId)).inFile).toMatchObject([
    { isThis: true, taken: [{ batchId: one.id }], fits: [{ batchId: two.id, isClear: true }] },
  ]);
  const { certificateId: second } = await take(world, certificateId, 0, two.id);
  expect(await readingOf(world, certificateId)).toMatchObject({
    lines: [{ lineNo: 1, pieces: 10 }],
    discrepancies: [],
    observations: [],
  });
  const { facts, lines, discrepancies, observations } = await readingOf(world, second);
  expect({ lines, discrepancies, observations }).toMatchObject({
    lines: [{ lineNo: 1, pieces: 6 }],
    discrepancies: [],
    observations: [],
  });
  expect(lines[0]?.facts.map((at) => facts[at]?.field)).toContain('lines[1].qty_accepted');
});

test('a paper with the parts of one batch stays used again where it is handed in for another', async () => {
  const world = await makePaperWorld(base);
  const [one, two] = [await sentBatch(world), await sentBatch(world)];
  const content = await certificatePaper(world, one.id);
  await handIn(world, one.id, { kind: 'certificate', content });
  const again = await handIn(world, two.id, { kind: 'certificate', content });
  await readAll(base);
  expect(await codesOf(world, again)).toContain('certificate_reused');
});

test('what a person corrects on one certificate of a file is not corrected on the other', async () => {
  const { world, batch, certificateId } = await stackForOne();
  const { certificateId: second } = await take(world, certificateId, 1, batch.id);
  await world.as(['inspector'], (ctx) =>
    correctReading(ctx, { certificateId: second, field: 'lines[0].qty_accepted', corrected: '3' }),
  );
  expect((await readingOf(world, second)).lines).toMatchObject([{ pieces: 3 }]);
  expect((await readingOf(world, certificateId)).lines).toMatchObject([{ pieces: 6 }]);
});

test('each certificate is taken up once for a batch, and only what the file holds', async () => {
  const { world, one, two, certificateId } = await stackForTwo();
  await expect(take(world, certificateId, 0, one.id)).rejects.toMatchObject({ code: 'conflict' });
  const { certificateId: second } = await take(world, certificateId, 1, two.id);
  await expect(take(world, certificateId, 1, two.id)).rejects.toMatchObject({
    code: 'conflict',
    details: { extra: { certificateId: second } },
  });
  await expect(take(world, second, 1, two.id)).rejects.toMatchObject({ code: 'conflict' });
  await expect(take(world, certificateId, 2, two.id)).rejects.toMatchObject({
    code: 'bad_input',
    details: { fields: [{ field: 'place' }] },
  });
});

test('refused for a batch that has not left, to an auditor and to another shop', async () => {
  const { world, two, certificateId } = await stackForTwo();
  const building = await world.as(['lead'], (ctx) => makeBatch(ctx, world.processorId));
  await expect(take(world, certificateId, 1, building.id)).rejects.toMatchObject({ code: 'conflict' });
  await expect(
    world.as(['auditor'], (ctx) => addFromFile(ctx, { certificateId, place: 1, batchId: two.id })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  const stranger = await makeWorld(base.db, base.owner);
  await expect(take(stranger, certificateId, 1, two.id)).rejects.toMatchObject({ code: 'not_found' });
  const theirs = await sentBatch(stranger);
  await expect(take(world, certificateId, 1, theirs.id)).rejects.toMatchObject({ code: 'not_found' });
});
