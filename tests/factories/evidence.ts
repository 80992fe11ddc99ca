import { hash } from '@node-rs/argon2';
import { eq } from 'drizzle-orm';
import { createHash } from 'node:crypto';

import type { Db } from '@/db/client';
import { certificates } from '@/db/schema/evidence';
import { files } from '@/db/schema/files';
import { users } from '@/db/schema/people';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { addCertificate } from '@/lib/certificates/add-certificate';
import { decideRequirement } from '@/lib/certificates/decide-requirement';
import { getCertificate } from '@/lib/certificates/get-certificate';
import { recordCertificate } from '@/lib/certificates/record-certificate';
import { signCertificate } from '@/lib/certificates/sign-certificate';
import type { FilePurpose, FileState } from '@/lib/files/purpose';
import { newId } from '@/lib/ids';
import { countIn } from '@/lib/receipts/count-in';
import { getReceiving } from '@/lib/receipts/queries';

export const PASSWORD = 'a-long-enough-word';
// As weak as the library allows: a test compares, it does not keep secrets.
const passwordHash = hash(PASSWORD, { memoryCost: 8, timeCost: 1, parallelism: 1 });

/** Gives a person the password that tests sign with. */
export async function givePassword(owner: Db, userId: string): Promise<void> {
  await owner
    .update(users)
    .set({ passwordHash: await passwordHash })
    .where(eq(users.id, userId));
}

/** The record of a file that arrived whole; its bytes are nobody's concern here. */
export async function makeFile(
  ctx: Ctx,
  given: {
    purpose: FilePurpose;
    batchId?: string;
    processorId?: string;
    state?: FileState;
    content?: string;
  },
): Promise<string> {
  const id = newId();
  const sha256 = createHash('sha256')
    .update(given.content ?? id)
    .digest('hex');
  await ctx.tx.insert(files).values({
    id,
    shopId: shopOf(ctx),
    batchId: given.batchId ?? null,
    processorId: given.processorId ?? null,
    purpose: given.purpose,
    name: `${id.slice(-4)}.pdf`,
    mediaType: 'application/pdf',
    size: 100,
    sha256,
    storageKey: `files/${id}`,
    state: given.state ?? 'verified',
    uploadedBy: 'Test Person',
    createdAt: ctx.now,
  });
  return id;
}

/** Counts in what is given for each line, in the order of the lines. */
export async function countInAll(
  ctx: Ctx,
  batchId: string,
  counts: readonly { good?: number; damaged?: number; short?: number; over?: number }[],
) {
  const { lines } = await getReceiving(ctx, { batchId });
  const counted = counts.map((count, at) => {
    const line = lines[at];
    if (!line) throw new Error('more counts than lines');
    const { good = 0, damaged = 0, short = 0, over = 0 } = count;
    const names = line.serialised ? line.awayPieces.map((piece) => piece.id) : [];
    return {
      lineId: line.id,
      good,
      damaged,
      short,
      over,
      note: '',
      goodPieceIds: names.slice(0, good),
      damagedPieceIds: names.slice(good, good + damaged),
    };
  });
  return countIn(ctx, { batchId, note: '', lines: counted, photos: [] });
}

/** A certificate whose number and date are entered. */
export async function makeCertificate(
  ctx: Ctx,
  batchId: string,
  given: { number?: string; content?: string } = {},
): Promise<string> {
  const fileId = await makeFile(ctx, {
    purpose: 'certificate',
    batchId,
    ...(given.content === undefined ? {} : { content: given.content }),
  });
  const { id } = await addCertificate(ctx, { batchId, fileId });
  await recordCertificate(ctx, {
    certificateId: id,
    version: 1,
    number: given.number ?? `C-${id.slice(-6)}`,
    datedOn: '2026-06-15',
  });
  return id;
}

/** Every requirement of the batch read as met. */
export async function decideAll(ctx: Ctx, certificateId: string): Promise<void> {
  const { requirements } = await getCertificate(ctx, { certificateId });
  for (const { id, decision } of requirements) {
    await decideRequirement(ctx, {
      certificateId,
      requirementId: id,
      version: decision?.version ?? null,
      stated: 'as ordered',
      verdict: 'meets',
      overrideReason: null,
      note: '',
    });
  }
}

/** What a screen would send to sign for these pieces, in the order of the lines. */
export async function signingInput(ctx: Ctx, certificateId: string, pieces: readonly number[]) {
  const { certificate, lines, requirements } = await getCertificate(ctx, { certificateId });
  const coverage = pieces.flatMap((count, at) =>
    count > 0 && lines[at] ? [{ lineId: lines[at].id, pieces: count }] : [],
  );
  const decisions = requirements.flatMap(({ id, decision }) =>
    decision ? [{ requirementId: id, version: decision.version }] : [],
  );
  return {
    certificateId,
    version: certificate.version,
    coverage,
    decisions,
    password: PASSWORD,
    reviewSeconds: 95,
  };
}

/** A certificate of the batch, proved and signed for these pieces. The person needs the password of `givePassword`. */
export async function makeSignedCertificate(ctx: Ctx, batchId: string, pieces: readonly number[]) {
  const certificateId = await makeCertificate(ctx, batchId);
  await decideAll(ctx, certificateId);
  return { certificateId, ...(await signCertificate(ctx, await signingInput(ctx, certificateId, pieces))) };
}

export const certificateOf = async (ctx: Ctx, certificateId: string) =>
  (await ctx.tx.select().from(certificates).where(eq(certificates.id, certificateId)))[0];
