import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { approvals } from '@/db/schema/organisations';
import { readings } from '@/db/schema/readings';
import { setRequirements } from '@/lib/batches/set-requirements';
import { dispatchBatch } from '@/lib/batches/dispatch-batch';
import { getBatchLines } from '@/lib/batches/get-batch-lines';
import { getCertificate } from '@/lib/certificates/get-certificate';
import { setAsideCertificate } from '@/lib/certificates/set-aside-certificate';
import { getCertificateReading } from '@/lib/readings/get-certificate-reading';
import { readCertificateAgain } from '@/lib/readings/read-certificate-again';

import { makeApproval, makeBatch, makeDispatchedBatch } from '../../factories/batches';
import {
  asked,
  certificatePaper,
  DONE_RIGHT,
  handIn,
  HEAT_TREAT,
  makePaperWorld,
  readAll,
  type Stated,
} from '../../factories/papers';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

const sentBatch = (world: World, pieces: readonly number[] = [10]) =>
  world.as(['lead'], (ctx) =>
    makeDispatchedBatch(ctx, world.processorId, { requirements: HEAT_TREAT, pieces }),
  );

const readingOf = (world: World, certificateId: string) =>
  world.as(['inspector'], (ctx) => getCertificateReading(ctx, { certificateId }));

async function handInCertificate(world: World, batchId: string, stated: Stated = {}) {
  const content = await certificatePaper(world, batchId, stated);
  return handIn(world, batchId, { kind: 'certificate', content });
}

/** A certificate that was handed in and read. */
async function readOf(stated: Stated = {}) {
  const world = await makePaperWorld(base);
  const batch = await sentBatch(world);
  const certificateId = await handInCertificate(world, batch.id, stated);
  await readAll(base);
  return { world, batch, certificateId, reading: await readingOf(world, certificateId) };
}

/** What is proposed for each requirement, by its name and line. */
async function proposedFor(world: World, certificateId: string) {
  const { requirements } = await world.as(['inspector'], (ctx) => getCertificate(ctx, { certificateId }));
  const { proposals } = await readingOf(world, certificateId);
  return Object.fromEntries(
    requirements.map(({ id, characteristic, lineNo }) => [
      lineNo === null ? characteristic : `${characteristic} ${lineNo}`,
      proposals.find(({ requirementId }) => requirementId === id),
    ]),
  );
}

test('a good certificate is proposed as met in everything, for all pieces, each with where it stands', async () => {
  const { world, certificateId, reading } = await readOf();
  expect(reading).toMatchObject({
    state: 'read',
    fault: null,
    recognised: false,
    certificateNumber: '26-00417',
    certificateDate: '2026-06-17',
    lines: [{ lineNo: 1, pieces: 10 }],
    discrepancies: [],
    corrections: [],
  });
  const proposed = await proposedFor(world, certificateId);
  expect(Object.values(proposed).map((one) => one?.verdict)).toEqual(HEAT_TREAT.map(() => 'meets'));
  const restsOn = (name: string) => proposed[name]?.facts.map((at) => reading.facts[at]?.field);
  expect(restsOn('Solution temperature')).toEqual(['cycles[0].set_temp']);
  expect(restsOn('Soak')).toEqual(['cycles[0].minutes']);
  expect(restsOn('Hardness')).toEqual(['readings[0].values']);
  const [page] = reading.pages;
  for (const { box, page: number } of reading.facts) {
    expect(number).toBe(1);
    expect(box[2]).toBeLessThanOrEqual(page?.width ?? 0);
    expect(box[3]).toBeLessThanOrEqual(page?.height ?? 0);
  }
  expect(page?.words.map(([word]) => word)).toContain('26-00417');
});

test('each planted fault is found where it is, and what is right stays right', async () => {
  const { world, certificateId, reading } = await readOf({
    order: 'TP-9999',
    pieces: [8],
    signed: false,
    statements: DONE_RIGHT.with(1, 'Soak: 20 min').with(3, 'Hardness: HRB 58'),
  });
  expect(reading.discrepancies.map(({ code }) => code).toSorted()).toEqual([
    'hardness_out_of_range',
    'quantity_mismatch',
    'signature_missing',
    'soak_too_short',
    'wrong_po',
  ]);
  expect(reading.lines).toMatchObject([{ lineNo: 1, pieces: 8 }]);
  expect(await proposedFor(world, certificateId)).toMatchObject({
    'Order number and revision': {
      verdict: 'does_not_meet',
      why: expect.stringContaining('TP-9999') as string,
    },
    'Solution temperature': { verdict: 'meets', stated: '920 °F' },
    Soak: { verdict: 'does_not_meet', stated: '20 min' },
    'Quench delay': { verdict: 'meets', stated: '7 s' },
    Hardness: { verdict: 'does_not_meet', stated: '58 HRB' },
    'Signature and date': { verdict: 'does_not_meet' },
  });
});

test('lines that must prove different things get their own verdicts from the same paper', async () => {
  const world = await makePaperWorld(base);
  const batchId = await world.as(['lead'], async (ctx) => {
    await makeApproval(ctx, world.processorId);
    const built = await makeBatch(ctx, world.processorId, { pieces: [10, 6], requirements: [] });
    const { lines } = await getBatchLines(ctx, { batchId: built.id });
    let { version } = built;
    for (const [at, limit] of ['HRB 63 or more', 'HRB 72 or more'].entries())
      ({ version } = await setRequirements(ctx, {
        batchId: built.id,
        version,
        lineId: lines[at]?.id ?? '',
        requirements: [asked('Hardness', limit)],
      }));
    await dispatchBatch(ctx, { batchId: built.id, version });
    return built.id;
  });
  const certificateId = await handInCertificate(world, batchId);
  await readAll(base);
  expect(await proposedFor(world, certificateId)).toMatchObject({
    'Hardness 1': { verdict: 'meets', stated: '70 HRB' },
    'Hardness 2': { verdict: 'does_not_meet', stated: '70 HRB' },
  });
  expect((await readingOf(world, certificateId)).lines).toMatchObject([
    { lineNo: 1, pieces: 10 },
    { lineNo: 2, pieces: 6 },
  ]);
});

const PAGE = '<!doctype html><html><body><h1>Certificate of conformance</h1></body></html>';

test.each<[string, (pdf: Buffer) => Buffer, RegExp]>([
  ['a page named .pdf', () => Buffer.from(PAGE), /named \.pdf, but it is .*page/i],
  ['a PDF of which the end was lost', (pdf) => pdf.subarray(0, 600), /breaks off before its end/],
  ['an empty file', () => Buffer.alloc(40), /empty/],
])(
  '%s is unreadable for a reason in words, and the next file is read all the same',
  async (_, spoil, says) => {
    const world = await makePaperWorld(base);
    const batch = await sentBatch(world);
    const good = await certificatePaper(world, batch.id);
    const spoilt = await handIn(world, batch.id, { kind: 'certificate', content: spoil(good) });
    const whole = await handIn(world, batch.id, { kind: 'certificate', content: good });
    await readAll(base);
    expect(await readingOf(world, spoilt)).toMatchObject({
      state: 'unreadable',
      fault: expect.stringMatching(says) as string,
      proposals: [],
      facts: [],
    });
    expect(await readingOf(world, whole)).toMatchObject({ state: 'read', certificateNumber: '26-00417' });
  },
);

test('a certificate whose number was used for another batch is named, entered by a person or not', async () => {
  const { world } = await readOf({ number: '26-00555' });
  const other = await sentBatch(world);
  const certificateId = await handInCertificate(world, other.id, { number: '26-00555' });
  await readAll(base);
  const reused = async () =>
    (await readingOf(world, certificateId)).discrepancies.filter(({ code }) => code === 'certificate_reused');
  expect(await reused()).toMatchObject([
    { stated: 'TP-0001', message: 'Certificate 26-00555 was received before for order TP-0001.' },
  ]);
});

test('an approval that did not hold on the day of the work is named, and one that did is not', async () => {
  const { world, certificateId } = await readOf();
  const approvalOf = (given: Partial<typeof approvals.$inferInsert>) =>
    base.owner.update(approvals).set(given).where(eq(approvals.shopId, world.shopId));
  const told = async () =>
    (await readingOf(world, certificateId)).discrepancies.filter(({ code }) => code === 'approval_not_valid');
  expect(await told()).toEqual([]);
  await approvalOf({ validTo: '2026-06-16' });
  expect(await told()).toMatchObject([{ stated: '2026-06-17', severity: 'blocks' }]);
  await approvalOf({ validTo: '2027-01-31', withdrawnAt: new Date('2026-06-16T12:00:00Z') });
  expect(await told()).toHaveLength(1);
  await approvalOf({ withdrawnAt: null, specifications: ['AMS 2759'] });
  expect(await told()).toMatchObject([{ message: expect.stringContaining('does not cover it') as string }]);
  await approvalOf({ specifications: ['AMS2770'] });
  expect(await told()).toEqual([]);
});

test('pieces on other papers of the batch count together; those of one that was set aside do not', async () => {
  const { world, batch, certificateId } = await readOf({ pieces: [6] });
  const rest = await handInCertificate(world, batch.id, { number: '26-00418', pieces: [4] });
  await readAll(base);
  const codes = async () => (await readingOf(world, certificateId)).discrepancies.map(({ code }) => code);
  expect(await codes()).toEqual([]);
  await world.as(['inspector'], (ctx) =>
    setAsideCertificate(ctx, { certificateId: rest, version: 1, reason: 'It came with the wrong load.' }),
  );
  expect(await codes()).toEqual(['quantity_mismatch']);
});

test('read again, it is read from the file once more; one that was unreadable may be read then', async () => {
  const { world, certificateId } = await readOf();
  await base.owner
    .update(readings)
    .set({ state: 'unreadable', faultCode: 'took_too_long', fault: 'It took too long.', content: null })
    .where(eq(readings.shopId, world.shopId));
  expect(await readingOf(world, certificateId)).toMatchObject({ state: 'unreadable', facts: [] });
  await world.as(['inspector'], (ctx) => readCertificateAgain(ctx, { certificateId }));
  expect(await readingOf(world, certificateId)).toMatchObject({ state: 'waiting', fault: null });
  expect(await readAll(base)).toBe(1);
  expect(await readingOf(world, certificateId)).toMatchObject({
    state: 'read',
    certificateNumber: '26-00417',
    lines: [{ lineNo: 1, pieces: 10 }],
  });
  await expect(
    world.as(['auditor'], (ctx) => readCertificateAgain(ctx, { certificateId })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
});

test('another shop is told that the certificate does not exist, and has nothing read', async () => {
  const { certificateId } = await readOf();
  const stranger = await makeWorld(base.db, base.owner);
  await expect(readingOf(stranger, certificateId)).rejects.toMatchObject({ code: 'not_found' });
  await expect(
    stranger.as(['inspector'], (ctx) => readCertificateAgain(ctx, { certificateId })),
  ).rejects.toMatchObject({ code: 'not_found' });
});
