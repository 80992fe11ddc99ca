import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { batches } from '@/db/schema/batches';
import { certificates, coverage, signatures } from '@/db/schema/evidence';
import { shops } from '@/db/schema/organisations';
import { getCertificate } from '@/lib/certificates/get-certificate';
import { sealOf } from '@/lib/certificates/seal';
import { signCertificateEndpoint } from '@/lib/certificates/endpoints';
import { signCertificate } from '@/lib/certificates/sign-certificate';
import { decideRequirement } from '@/lib/certificates/decide-requirement';
import type { Endpoint } from '@/lib/api/endpoint';
import { newId } from '@/lib/ids';

import { makeDispatchedBatch } from '../../factories/batches';
import {
  countInAll,
  decideAll,
  givePassword,
  makeCertificate,
  makeFile,
  makeSignedCertificate,
  signingInput,
} from '../../factories/evidence';
import { lastAudit, stageNow } from '../../factories/standing';
import { inSteps } from '../../factories/uploads';
import { makeWorld } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

async function setup(pieces: readonly number[] = [10], back = pieces) {
  const world = await makeWorld(base.db, base.owner);
  await givePassword(base.owner, world.userId);
  const batch = await world.as(['lead'], async (ctx) => {
    const dispatched = await makeDispatchedBatch(ctx, world.processorId, { pieces });
    await countInAll(
      ctx,
      dispatched.id,
      back.map((good) => ({ good })),
    );
    return dispatched;
  });
  const certificateId = await world.as(['inspector'], async (ctx) => {
    const id = await makeCertificate(ctx, batch.id, { number: '26-04177' });
    await decideAll(ctx, id);
    return id;
  });
  return { world, batch, certificateId };
}

test('signing seals file, decisions, coverage and sentence together, and the batch is proved', async () => {
  const { world, batch, certificateId } = await setup([10, 5]);
  await world.as(['inspector'], async (ctx) => {
    const done = await signCertificate(ctx, await signingInput(ctx, certificateId, [10, 5]));
    expect(done.pieces).toBe(15);
    const [kept] = await ctx.tx.select().from(signatures).where(eq(signatures.id, done.signatureId));
    expect(kept && sealOf(kept.sealed)).toBe(done.seal);
    const sealed = JSON.parse(kept?.sealed ?? '{}') as Record<string, unknown>;
    expect(sealed).toMatchObject({
      certificate: { number: '26-04177', fileSha256: kept?.fileSha256 },
      batch: { number: batch.number },
      dispatchedBySigner: true,
      signer: { id: world.userId },
    });
    expect(sealed['sentence']).toContain('I also dispatched this batch.');
    expect(sealed['decisions']).toMatchObject([{ characteristic: 'Hardness', verdict: 'meets' }]);
    expect(await stageNow(ctx, batch.id)).toBe('proved');
    expect(await lastAudit(ctx, 'certificate.sign')).toMatchObject({
      entityId: certificateId,
      after: { pieces: 15, seal: done.seal, dispatchedBySigner: true },
    });
    expect((await getCertificate(ctx, { certificateId })).signatures[0]).toMatchObject({
      intact: true,
      reviewSeconds: 95,
      signerName: 'Test Person',
    });
  });
});

test('one certificate is signed twice where the pieces came back twice', async () => {
  const { world, batch, certificateId } = await setup([10], [4]);
  await world.as(['inspector'], async (ctx) => {
    await signCertificate(ctx, await signingInput(ctx, certificateId, [4]));
    await countInAll(ctx, batch.id, [{ good: 6 }]);
    await signCertificate(ctx, await signingInput(ctx, certificateId, [6]));
    expect(
      await ctx.tx
        .select({ pieces: coverage.pieces })
        .from(coverage)
        .where(eq(coverage.certificateId, certificateId))
        .orderBy(coverage.id),
    ).toEqual([{ pieces: 4 }, { pieces: 6 }]);
    expect(await stageNow(ctx, batch.id)).toBe('proved');
  });
});

test('nobody signs for more than came back good and is uncovered', async () => {
  const { world, certificateId, batch } = await setup([10], [4]);
  await world.as(['inspector'], async (ctx) => {
    await expect(signCertificate(ctx, await signingInput(ctx, certificateId, [5]))).rejects.toMatchObject({
      code: 'bad_input',
      details: {
        fields: [
          {
            field: 'coverage.0.pieces',
            message: expect.stringContaining('4 came back good and uncovered') as string,
          },
        ],
      },
    });
    await makeSignedCertificate(ctx, batch.id, [3]);
    await expect(signCertificate(ctx, await signingInput(ctx, certificateId, [2]))).rejects.toMatchObject({
      code: 'bad_input',
    });
  });
});

test('a wrong password signs nothing', async () => {
  const { world, certificateId } = await setup();
  await world.as(['inspector'], async (ctx) => {
    await expect(
      signCertificate(ctx, { ...(await signingInput(ctx, certificateId, [10])), password: 'guessed' }),
    ).rejects.toMatchObject({ code: 'bad_input', details: { fields: [{ field: 'password' }] } });
    expect(await ctx.tx.select().from(signatures)).toEqual([]);
  });
});

test('guessing the password of a signature ends after some tries, right ones do not count', async () => {
  const { world, certificateId } = await setup();
  const input = await world.as(['inspector'], (ctx) => signingInput(ctx, certificateId, [11]));
  const sign = (password: string) =>
    inSteps((work) => world.as(['inspector'], work), signCertificateEndpoint as unknown as Endpoint, {
      ...input,
      password,
    });
  for (let times = 0; times < 10; times += 1)
    await expect(sign(input.password)).rejects.toMatchObject({
      code: 'bad_input',
      message: expect.stringContaining('Enter 10 or less') as string,
    });
  for (let times = 0; times < 8; times += 1)
    await expect(sign('guessed')).rejects.toMatchObject({ code: 'bad_input' });
  await expect(sign('guessed')).rejects.toMatchObject({ code: 'too_many' });
});

test('a person without a password cannot sign, nor can a program with a token', async () => {
  const world = await makeWorld(base.db, base.owner);
  const batch = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId));
  await world.as(['inspector'], async (ctx) => {
    const certificateId = await makeCertificate(ctx, batch.id);
    const input = {
      certificateId,
      version: 2,
      coverage: [{ lineId: newId(), pieces: 1 }],
      decisions: [],
      password: 'any',
      reviewSeconds: null,
    };
    await expect(signCertificate(ctx, input)).rejects.toMatchObject({
      code: 'not_allowed',
      message: expect.stringContaining('no password') as string,
    });
    const token = {
      ...ctx,
      actor: {
        kind: 'token',
        tokenId: newId(),
        userId: world.userId,
        name: 'T',
        roles: ['inspector'],
        scopes: ['certificate.read'],
      } as const,
    };
    await expect(signCertificate(token, input)).rejects.toMatchObject({ code: 'not_allowed' });
  });
});

test('an undecided requirement, or one that is not met, keeps a certificate from being signed', async () => {
  const world = await makeWorld(base.db, base.owner);
  await givePassword(base.owner, world.userId);
  const batch = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId));
  await world.as(['inspector'], async (ctx) => {
    await countInAll(ctx, batch.id, [{ good: 10 }]);
    const certificateId = await makeCertificate(ctx, batch.id);
    await expect(signCertificate(ctx, await signingInput(ctx, certificateId, [10]))).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('1 to decide before you sign: Hardness') as string,
    });
    const [requirement] = (await getCertificate(ctx, { certificateId })).requirements;
    const decide = { certificateId, requirementId: requirement?.id ?? '', stated: '88 HRB', note: '' };
    await decideRequirement(ctx, {
      ...decide,
      version: null,
      verdict: 'does_not_meet',
      overrideReason: null,
    });
    await expect(signCertificate(ctx, await signingInput(ctx, certificateId, [10]))).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('not met') as string,
    });
    await decideRequirement(ctx, {
      ...decide,
      version: 1,
      verdict: 'does_not_meet',
      overrideReason: 'Drawing note 7 allows up to 90 HRB here.',
    });
    await expect(signCertificate(ctx, await signingInput(ctx, certificateId, [10]))).resolves.toMatchObject({
      pieces: 10,
    });
  });
});

test('the same person who dispatched is refused where the shop says so', async () => {
  const { world, certificateId } = await setup();
  await base.owner.update(shops).set({ dispatchAndAcceptance: 'refuse' }).where(eq(shops.id, world.shopId));
  await world.as(['inspector'], async (ctx) => {
    expect((await getCertificate(ctx, { certificateId })).dispatchedByYou).toBe('refuse');
    await expect(signCertificate(ctx, await signingInput(ctx, certificateId, [10]))).rejects.toMatchObject({
      code: 'not_allowed',
      message: expect.stringContaining('You dispatched') as string,
    });
  });
  await base.owner.update(batches).set({ dispatchedBy: newId() }).where(eq(batches.shopId, world.shopId));
  await world.as(['inspector'], async (ctx) => {
    const done = await signCertificate(ctx, await signingInput(ctx, certificateId, [10]));
    const [kept] = await ctx.tx.select().from(signatures).where(eq(signatures.id, done.signatureId));
    expect(kept?.sentence).not.toContain('also dispatched');
  });
});

test('only inspectors sign', async () => {
  const { world, certificateId } = await setup();
  const input = await world.as(['inspector'], (ctx) => signingInput(ctx, certificateId, [10]));
  await expect(
    world.as(['lead', 'office', 'admin', 'auditor'], (ctx) => signCertificate(ctx, input)),
  ).rejects.toMatchObject({ code: 'not_allowed' });
});

test('what changed since the signer looked is not signed: a decision, or the number', async () => {
  const { world, certificateId } = await setup();
  await world.as(['inspector'], async (ctx) => {
    const input = await signingInput(ctx, certificateId, [10]);
    await expect(signCertificate(ctx, { ...input, version: input.version - 1 })).rejects.toMatchObject({
      code: 'conflict',
    });
    await decideAll(ctx, certificateId);
    await expect(signCertificate(ctx, input)).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('Hardness') as string,
    });
  });
});

test('without number and date, and without a whole file, nothing is signed', async () => {
  const { world, certificateId, batch } = await setup();
  await world.as(['inspector'], async (ctx) => {
    const input = await signingInput(ctx, certificateId, [10]);
    await ctx.tx.update(certificates).set({ number: null }).where(eq(certificates.id, certificateId));
    await expect(signCertificate(ctx, input)).rejects.toMatchObject({
      code: 'conflict',
      details: { fields: [{ field: 'number' }] },
    });
    const fileId = await makeFile(ctx, { purpose: 'certificate', batchId: batch.id, state: 'refused' });
    await ctx.tx.update(certificates).set({ number: 'X', fileId }).where(eq(certificates.id, certificateId));
    await expect(signCertificate(ctx, input)).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('did not arrive whole') as string,
    });
  });
});

test('another shop cannot sign it, and is told it does not exist', async () => {
  const { world, certificateId } = await setup();
  const input = await world.as(['inspector'], (ctx) => signingInput(ctx, certificateId, [10]));
  const stranger = await makeWorld(base.db, base.owner);
  await givePassword(base.owner, stranger.userId);
  await expect(stranger.as(['inspector'], (ctx) => signCertificate(ctx, input))).rejects.toMatchObject({
    code: 'not_found',
  });
});

test('two who sign for the same pieces at once: one is told they are covered', async () => {
  const { world, batch, certificateId } = await setup();
  const second = await world.as(['inspector'], async (ctx) => {
    const id = await makeCertificate(ctx, batch.id);
    await decideAll(ctx, id);
    return id;
  });
  const sign = (id: string) =>
    world.as(['inspector'], async (ctx) => signCertificate(ctx, await signingInput(ctx, id, [10])));
  const outcomes = await Promise.allSettled([sign(certificateId), sign(second)]);
  expect(outcomes.map((one) => one.status).sort()).toEqual(['fulfilled', 'rejected']);
  const rows = await world.as(['inspector'], (ctx) =>
    ctx.tx.select({ pieces: coverage.pieces }).from(coverage),
  );
  expect(rows).toEqual([{ pieces: 10 }]);
});

test('a signature cannot be changed or taken away, not even by the owner of the tables', async () => {
  const { world, certificateId } = await setup();
  const { signatureId } = await world.as(['inspector'], async (ctx) =>
    signCertificate(ctx, await signingInput(ctx, certificateId, [10])),
  );
  await expect(
    base.owner.update(signatures).set({ sentence: 'other' }).where(eq(signatures.id, signatureId)),
  ).rejects.toThrow();
  await expect(base.owner.delete(signatures).where(eq(signatures.id, signatureId))).rejects.toThrow();
});
