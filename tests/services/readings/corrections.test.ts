import { expect, test } from 'vitest';

import { getCertificate } from '@/lib/certificates/get-certificate';
import { setAsideCertificate } from '@/lib/certificates/set-aside-certificate';
import { correctReading } from '@/lib/readings/correct-reading';
import { getCertificateReading } from '@/lib/readings/get-certificate-reading';

import { makeDispatchedBatch } from '../../factories/batches';
import {
  certificatePaper,
  DONE_RIGHT,
  handIn,
  HEAT_TREAT,
  makePaperWorld,
  readAll,
} from '../../factories/papers';
import { lastAudit } from '../../factories/standing';
import { makeWorld, TODAY, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

/** A certificate on which the hardness reads 58 where 63 is asked, and 8 pieces of 10. */
async function setup({ read = true, signed = true } = {}) {
  const world = await makePaperWorld(base);
  const batch = await world.as(['lead'], (ctx) =>
    makeDispatchedBatch(ctx, world.processorId, { requirements: HEAT_TREAT }),
  );
  const content = await certificatePaper(world, batch.id, {
    pieces: [8],
    signed,
    statements: DONE_RIGHT.with(3, 'Hardness: HRB 58'),
  });
  const certificateId = await handIn(world, batch.id, { kind: 'certificate', content });
  if (read) await readAll(base);
  return { world, certificateId };
}

const HARDNESS = 'readings[0].values';

const correct = (world: World, certificateId: string, field: string, corrected: string) =>
  world.as(['inspector'], (ctx) => correctReading(ctx, { certificateId, field, corrected }));

const readingOf = (world: World, certificateId: string) =>
  world.as(['inspector'], (ctx) => getCertificateReading(ctx, { certificateId }));

test('a correction counts in what is proposed; what was read is shown beside it, and the trail has both', async () => {
  const { world, certificateId } = await setup();
  const codes = async () => (await readingOf(world, certificateId)).discrepancies.map(({ code }) => code);
  expect((await codes()).toSorted()).toEqual(['hardness_out_of_range', 'quantity_mismatch']);
  await correct(world, certificateId, HARDNESS, '68');
  await correct(world, certificateId, 'lines[0].qty_accepted', '10');
  const after = await readingOf(world, certificateId);
  expect(after.discrepancies).toEqual([]);
  expect(after.lines).toMatchObject([{ lineNo: 1, pieces: 10 }]);
  expect(after.proposals).toContainEqual(expect.objectContaining({ stated: '68 HRB', verdict: 'meets' }));
  expect(after.facts.find(({ field }) => field === HARDNESS)).toMatchObject({ value: '58' });
  expect(after.corrections).toEqual([
    { field: HARDNESS, read: '58', corrected: '68', correctedBy: 'Test Person', correctedAt: TODAY },
    expect.objectContaining({ field: 'lines[0].qty_accepted', read: '8', corrected: '10' }),
  ]);
  await world.as(['inspector'], async (ctx) => {
    expect(await lastAudit(ctx, 'certificate.correct_reading')).toMatchObject({
      entityId: certificateId,
      before: { field: 'lines[0].qty_accepted', read: 8 },
      after: { field: 'lines[0].qty_accepted', corrected: '10' },
    });
  });
});

test('a signature that the machine missed and a person sees is proposed as met, and points at nothing', async () => {
  const { world, certificateId } = await setup({ signed: false });
  const signature = async () => {
    const { facts, proposals } = await readingOf(world, certificateId);
    const { requirements } = await world.as(['inspector'], (ctx) => getCertificate(ctx, { certificateId }));
    const id = requirements.find(({ characteristic }) => characteristic === 'Signature and date')?.id;
    const proposal = proposals.find(({ requirementId }) => requirementId === id);
    return { verdict: proposal?.verdict, restsOn: proposal?.facts.map((at) => facts[at]?.field) };
  };
  expect(await signature()).toEqual({ verdict: 'does_not_meet', restsOn: ['certificate_date'] });
  await correct(world, certificateId, 'signature_present', 'yes');
  expect(await signature()).toEqual({ verdict: 'meets', restsOn: ['certificate_date'] });
  await correct(world, certificateId, 'signature_present', 'no');
  expect((await signature()).verdict).toBe('does_not_meet');
});

test('of two corrections of a field the later counts, and both stay', async () => {
  const { world, certificateId } = await setup();
  await correct(world, certificateId, HARDNESS, '68');
  await correct(world, certificateId, HARDNESS, '61');
  const { corrections, proposals } = await readingOf(world, certificateId);
  expect(corrections.map(({ corrected }) => corrected)).toEqual(['68', '61']);
  expect(proposals).toContainEqual(expect.objectContaining({ stated: '61 HRB', verdict: 'does_not_meet' }));
});

test('a number that a person reads otherwise is the number that is compared', async () => {
  const { world, certificateId } = await setup();
  await correct(world, certificateId, 'certificate_number', '26-00419');
  await correct(world, certificateId, 'purchase_order', 'TP-0777');
  expect(await readingOf(world, certificateId)).toMatchObject({
    certificateNumber: '26-00419',
    discrepancies: expect.arrayContaining([
      expect.objectContaining({ code: 'wrong_po', stated: 'TP-0777' }),
    ]) as unknown,
  });
});

test.each([
  ['certificate_date', '17th of June', 'corrected'],
  ['lines[0].qty_accepted', 'ten', 'corrected'],
  ['__proto__.toString', 'x', 'field'],
  ['no_such_thing', 'x', 'field'],
])('%s as %s is refused, and nothing is kept', async (field, corrected, named) => {
  const { world, certificateId } = await setup();
  await expect(correct(world, certificateId, field, corrected)).rejects.toMatchObject({
    code: 'bad_input',
    details: { fields: [{ field: named }] },
  });
  expect((await readingOf(world, certificateId)).corrections).toEqual([]);
});

test('refused where it was not read, where it was set aside, to an auditor and to another shop', async () => {
  const waiting = await setup({ read: false });
  await expect(correct(waiting.world, waiting.certificateId, HARDNESS, '68')).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringContaining('was not read') as string,
  });
  await readAll(base);
  const { world, certificateId } = waiting;
  await expect(
    world.as(['auditor'], (ctx) => correctReading(ctx, { certificateId, field: HARDNESS, corrected: '68' })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  const stranger = await makeWorld(base.db, base.owner);
  await expect(correct(stranger, certificateId, HARDNESS, '68')).rejects.toMatchObject({ code: 'not_found' });
  await world.as(['inspector'], (ctx) =>
    setAsideCertificate(ctx, { certificateId, version: 1, reason: 'A second copy of the same.' }),
  );
  await expect(correct(world, certificateId, HARDNESS, '68')).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringContaining('set aside') as string,
  });
});
