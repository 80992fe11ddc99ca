import { expect, test } from 'vitest';

import { addCertificate } from '@/lib/certificates/add-certificate';
import { decideRequirement } from '@/lib/certificates/decide-requirement';
import { getCertificate } from '@/lib/certificates/get-certificate';
import { listCertificates } from '@/lib/certificates/list-certificates';
import { recordCertificate } from '@/lib/certificates/record-certificate';
import { setAsideCertificate } from '@/lib/certificates/set-aside-certificate';
import { signCertificate } from '@/lib/certificates/sign-certificate';
import { takeUpCertificate } from '@/lib/certificates/take-up-certificate';
import { newId } from '@/lib/ids';

import { makeBatch, makeDispatchedBatch } from '../../factories/batches';
import {
  certificateOf,
  countInAll,
  decideAll,
  givePassword,
  makeCertificate,
  makeFile,
  makeSignedCertificate,
  signingInput,
} from '../../factories/evidence';
import { lastAudit } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

async function setup(pieces: readonly number[] = [10]) {
  const world = await makeWorld(base.db, base.owner);
  await givePassword(base.owner, world.userId);
  const batch = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId, { pieces }));
  const certificateId = await world.as(['inspector'], (ctx) => makeCertificate(ctx, batch.id));
  return { world, batch, certificateId };
}

const firstRequirement = (world: World, certificateId: string) =>
  world.as(
    ['inspector'],
    async (ctx) => (await getCertificate(ctx, { certificateId })).requirements[0]?.id ?? '',
  );

test('a certificate that came on paper is added to a batch that has left', async () => {
  const { world, batch } = await setup();
  await world.as(['office'], async (ctx) => {
    const fileId = await makeFile(ctx, { purpose: 'certificate', batchId: batch.id });
    const { id } = await addCertificate(ctx, { batchId: batch.id, fileId });
    expect(await certificateOf(ctx, id)).toMatchObject({ number: null, sentBy: 'Test Person' });
    expect(await lastAudit(ctx, 'certificate.add')).toMatchObject({ entityId: id });
    await expect(addCertificate(ctx, { batchId: batch.id, fileId })).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('already a certificate') as string,
    });
  });
});

test('a certificate for a batch that has not left is refused', async () => {
  const world = await makeWorld(base.db, base.owner);
  await world.as(['lead'], async (ctx) => {
    const batch = await makeBatch(ctx, world.processorId);
    const fileId = await makeFile(ctx, { purpose: 'certificate', batchId: batch.id });
    await expect(addCertificate(ctx, { batchId: batch.id, fileId })).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('has not left yet') as string,
    });
  });
});

test('an auditor adds nothing; a file of another purpose, batch or shop is no certificate', async () => {
  const { world, batch } = await setup();
  const fileId = await world.as(['lead'], (ctx) =>
    makeFile(ctx, { purpose: 'certificate', batchId: batch.id }),
  );
  await expect(
    world.as(['auditor'], (ctx) => addCertificate(ctx, { batchId: batch.id, fileId })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  await world.as(['lead'], async (ctx) => {
    const photo = await makeFile(ctx, { purpose: 'photo', batchId: batch.id });
    await expect(addCertificate(ctx, { batchId: batch.id, fileId: photo })).rejects.toMatchObject({
      code: 'bad_input',
    });
    await expect(addCertificate(ctx, { batchId: batch.id, fileId: newId() })).rejects.toMatchObject({
      code: 'bad_input',
    });
  });
  const stranger = await makeWorld(base.db, base.owner);
  await expect(
    stranger.as(['lead'], (ctx) => addCertificate(ctx, { batchId: batch.id, fileId })),
  ).rejects.toMatchObject({ code: 'not_found' });
});

test('number and date are recorded by inspectors, with what they were before', async () => {
  const { world, certificateId } = await setup();
  await world.as(['inspector'], async (ctx) => {
    await recordCertificate(ctx, { certificateId, version: 2, number: '26-1', datedOn: '2026-06-16' });
    expect(await certificateOf(ctx, certificateId)).toMatchObject({
      number: '26-1',
      datedOn: '2026-06-16',
      version: 3,
    });
    expect(await lastAudit(ctx, 'certificate.record')).toMatchObject({ after: { number: '26-1' } });
    await expect(
      recordCertificate(ctx, { certificateId, version: 2, number: '26-2', datedOn: '2026-06-16' }),
    ).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('changed meanwhile') as string,
    });
  });
  await expect(
    world.as(['lead', 'admin'], (ctx) =>
      recordCertificate(ctx, { certificateId, version: 3, number: 'x', datedOn: '2026-06-16' }),
    ),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  const stranger = await makeWorld(base.db, base.owner);
  await expect(
    stranger.as(['inspector'], (ctx) =>
      recordCertificate(ctx, { certificateId, version: 3, number: 'x', datedOn: '2026-06-16' }),
    ),
  ).rejects.toMatchObject({ code: 'not_found' });
});

test('a later decision replaces an earlier one, which stays in the trail', async () => {
  const { world, certificateId } = await setup();
  const requirementId = await firstRequirement(world, certificateId);
  await world.as(['inspector'], async (ctx) => {
    const decide = { certificateId, requirementId, overrideReason: null, note: '' };
    expect(
      await decideRequirement(ctx, { ...decide, version: null, stated: '', verdict: 'not_stated' }),
    ).toEqual({ version: 1 });
    expect(
      await decideRequirement(ctx, { ...decide, version: 1, stated: '76 HRB', verdict: 'meets' }),
    ).toEqual({ version: 2 });
    expect((await getCertificate(ctx, { certificateId })).requirements[0]?.decision).toMatchObject({
      stated: '76 HRB',
      verdict: 'meets',
      sealed: false,
    });
    expect(await lastAudit(ctx, 'certificate.decide')).toMatchObject({
      before: { verdict: 'not_stated' },
      after: { verdict: 'meets' },
    });
    await expect(
      decideRequirement(ctx, { ...decide, version: 1, stated: '', verdict: 'meets' }),
    ).rejects.toMatchObject({ code: 'conflict' });
  });
});

test('an override is its own entry in the trail', async () => {
  const { world, certificateId } = await setup();
  const requirementId = await firstRequirement(world, certificateId);
  await world.as(['inspector'], async (ctx) => {
    await decideRequirement(ctx, {
      certificateId,
      requirementId,
      version: null,
      stated: '',
      verdict: 'not_stated',
      overrideReason: 'The order does not ask for it on this lot.',
      note: '',
    });
    expect(await lastAudit(ctx, 'certificate.override')).toMatchObject({
      after: { overrideReason: 'The order does not ask for it on this lot.' },
    });
  });
});

test('decisions are for inspectors, on requirements of the same batch, and stay once sealed', async () => {
  const { world, batch, certificateId } = await setup();
  const requirementId = await firstRequirement(world, certificateId);
  const decide = {
    certificateId,
    requirementId,
    version: null,
    stated: '',
    verdict: 'meets' as const,
    overrideReason: null,
    note: '',
  };
  await expect(
    world.as(['lead', 'office', 'admin'], (ctx) => decideRequirement(ctx, decide)),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  await expect(
    world.as(['inspector'], (ctx) => decideRequirement(ctx, { ...decide, requirementId: newId() })),
  ).rejects.toMatchObject({ code: 'not_found' });
  const stranger = await makeWorld(base.db, base.owner);
  await expect(stranger.as(['inspector'], (ctx) => decideRequirement(ctx, decide))).rejects.toMatchObject({
    code: 'not_found',
  });
  await world.as(['inspector'], async (ctx) => {
    await countInAll(ctx, batch.id, [{ good: 10 }]);
    await decideAll(ctx, certificateId);
    await signCertificate(ctx, await signingInput(ctx, certificateId, [10]));
    await expect(
      decideRequirement(ctx, { ...decide, version: 1, verdict: 'not_stated' }),
    ).rejects.toMatchObject({ code: 'conflict', message: expect.stringContaining('sealed') as string });
    await expect(
      recordCertificate(ctx, { certificateId, version: 2, number: 'other', datedOn: '2026-06-16' }),
    ).rejects.toMatchObject({ code: 'conflict' });
  });
});

test('a second copy is set aside with a reason, and taken up again', async () => {
  const { world, certificateId } = await setup();
  await world.as(['inspector'], async (ctx) => {
    await setAsideCertificate(ctx, { certificateId, version: 2, reason: 'Second copy' });
    expect(await lastAudit(ctx, 'certificate.set_aside')).toMatchObject({ after: { reason: 'Second copy' } });
    await expect(decideAll(ctx, certificateId)).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('set aside') as string,
    });
    await expect(
      setAsideCertificate(ctx, { certificateId, version: 3, reason: 'again' }),
    ).rejects.toMatchObject({ code: 'conflict' });
    await takeUpCertificate(ctx, { certificateId, version: 3 });
    expect(await certificateOf(ctx, certificateId)).toMatchObject({ setAsideAt: null, version: 4 });
    await expect(takeUpCertificate(ctx, { certificateId, version: 4 })).rejects.toMatchObject({
      code: 'conflict',
    });
  });
  await expect(
    world.as(['lead'], (ctx) => setAsideCertificate(ctx, { certificateId, version: 4, reason: 'x' })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  await expect(
    world.as(['lead'], (ctx) => takeUpCertificate(ctx, { certificateId, version: 4 })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  const stranger = await makeWorld(base.db, base.owner);
  await expect(
    stranger.as(['inspector'], (ctx) => setAsideCertificate(ctx, { certificateId, version: 4, reason: 'x' })),
  ).rejects.toMatchObject({ code: 'not_found' });
  await expect(
    stranger.as(['inspector'], (ctx) => takeUpCertificate(ctx, { certificateId, version: 4 })),
  ).rejects.toMatchObject({ code: 'not_found' });
});

test('a signed certificate cannot be set aside', async () => {
  const { world, batch } = await setup();
  await world.as(['inspector'], async (ctx) => {
    await countInAll(ctx, batch.id, [{ good: 10 }]);
    const { certificateId } = await makeSignedCertificate(ctx, batch.id, [10]);
    await expect(
      setAsideCertificate(ctx, { certificateId, version: 2, reason: 'second copy' }),
    ).rejects.toMatchObject({ code: 'conflict', message: expect.stringContaining('signed') as string });
  });
});

test('the screen shows what other certificates cover, and the same file in another batch by name', async () => {
  const { world, batch, certificateId } = await setup([16]);
  await world.as(['inspector'], async (ctx) => {
    await countInAll(ctx, batch.id, [{ good: 16 }]);
    const other = await makeSignedCertificate(ctx, batch.id, [12]);
    const seen = await getCertificate(ctx, { certificateId });
    expect(seen.lines[0]).toMatchObject({
      pieces: 16,
      covered: 12,
      coverable: 4,
      here: 0,
      elsewhere: [{ certificateId: other.certificateId, pieces: 12 }],
    });
    expect(seen.sameFile).toEqual([]);
  });
  await world.as(['lead'], async (ctx) => {
    const [one, two] = [
      await makeDispatchedBatch(ctx, world.processorId),
      await makeDispatchedBatch(ctx, world.processorId),
    ];
    const add = async (batchId: string) =>
      addCertificate(ctx, {
        batchId,
        fileId: await makeFile(ctx, { purpose: 'certificate', batchId, content: 'same' }),
      });
    const [a, b] = [await add(one.id), await add(two.id)];
    expect((await getCertificate(ctx, { certificateId: b.id })).sameFile).toMatchObject([
      { certificateId: a.id, batchNumber: one.number, sameBatch: false },
    ]);
  });
});

test('the list pages by key, what waits to be proved first', async () => {
  const { world, batch } = await setup([10]);
  await world.as(['inspector'], async (ctx) => {
    await countInAll(ctx, batch.id, [{ good: 10 }]);
    const signed = await makeSignedCertificate(ctx, batch.id, [10]);
    const late = await makeCertificate(ctx, batch.id);
    const all = [];
    let after: string | undefined;
    do {
      const page = await listCertificates(ctx, { limit: 1, ...(after === undefined ? {} : { after }) });
      all.push(...page.rows);
      after = page.next ?? undefined;
    } while (after !== undefined);
    expect(all.map((row) => row.state)).toEqual(['waiting', 'waiting', 'signed']);
    expect(all[0]?.id).toBe(late);
    expect(all.at(-1)).toMatchObject({
      id: signed.certificateId,
      coveredPieces: 10,
      requirements: 1,
      decided: 1,
    });
  });
  const stranger = await makeWorld(base.db, base.owner);
  await stranger.as(['auditor'], async (ctx) =>
    expect((await listCertificates(ctx, { limit: 50 })).rows).toEqual([]),
  );
  await expect(
    stranger.as(['auditor'], (ctx) => getCertificate(ctx, { certificateId: newId() })),
  ).rejects.toMatchObject({ code: 'not_found' });
});
