import { and, asc, eq, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { batchLines, requirements } from '@/db/schema/batches';
import { coverage, decisions, signatures } from '@/db/schema/evidence';
import { nonconformances } from '@/db/schema/nonconformances';
import { files } from '@/db/schema/files';
import { balances } from '@/db/schema/lots';
import { shops } from '@/db/schema/organisations';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError, changedMeanwhile } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { verifyPasswordAgain } from '@/lib/people/verify-password-again';
import { readLineStanding, type LineStanding } from '@/lib/receipts/line-standing';

import type { SignCertificate } from './prove-contract';
import { faultsOfCoverage } from './coverable';
import { lockCertificate, refuseOtherVersion, refuseSetAside } from './lock-certificate';
import { readinessOf } from './ready-to-sign';
import { sealUp, type Sealed } from './seal';
import { signingSentence } from './signing-sentence';

type Input = z.output<typeof SignCertificate>;

/**
 * Signs that a certificate covers these pieces and no others. What was compared, decided and counted is sealed
 * together with the hash of the file, so that later nobody can say it was another page or another number.
 */
export async function signCertificate(ctx: Ctx, input: Input) {
  authorize(ctx, 'certificate.prove');
  // Before anything is locked: comparing a password takes a while on purpose.
  const signer = await verifyPasswordAgain(ctx, input.password);
  const locked = await lockCertificate(ctx, input.certificateId);
  const { certificate, batch } = locked;
  refuseSetAside(locked);
  refuseOtherVersion(locked, input.version);
  const dispatchedBySigner = batch.dispatchedBy === signer.id;
  if (dispatchedBySigner) await refuseSameHands(ctx, batch.number);
  const named = namedOf(certificate);
  const file = await wholeFileOf(ctx, certificate.fileId);
  const lines = await readLineStanding(ctx, batch.id);
  refuseFaults(input, lines);
  const decided = await decidedFor(ctx, input, batch.id);

  const id = newId();
  const sentence = signingSentence({ dispatchedToo: dispatchedBySigner });
  const content: Sealed = {
    form: 'lotwright certificate signature 1',
    certificate: { id: certificate.id, ...named, fileId: certificate.fileId, fileSha256: file.sha256 },
    batch: { id: batch.id, number: batch.number, orderNumber: batch.orderNumber },
    decisions: decided,
    coverage: input.coverage.map(({ lineId, pieces }) => ({ ...namesOf(lines, lineId), pieces })),
    held: await heldNow(ctx, batch.id),
    sentence,
    dispatchedBySigner,
    signer,
    signedAt: ctx.now.toISOString(),
  };
  const { sealed, seal } = sealUp(content);
  const shopId = shopOf(ctx);
  await ctx.tx.insert(signatures).values({
    id,
    shopId,
    certificateId: certificate.id,
    batchId: batch.id,
    sentence,
    fileSha256: file.sha256,
    sealed,
    seal,
    signedBy: signer.id,
    signerName: signer.name,
    signedAt: ctx.now,
    reviewSeconds: input.reviewSeconds,
  });
  await ctx.tx.insert(coverage).values(
    input.coverage.map(({ lineId, pieces }) => ({
      shopId,
      signatureId: id,
      certificateId: certificate.id,
      lineId,
      pieces,
    })),
  );
  const pieces = input.coverage.reduce((sum, line) => sum + line.pieces, 0);
  await recordAudit(ctx, {
    action: 'certificate.sign',
    entity: 'certificate',
    entityId: certificate.id,
    after: {
      signatureId: id,
      batch: batch.number,
      pieces,
      coverage: content.coverage,
      fileSha256: file.sha256,
      seal,
      dispatchedBySigner,
    },
  });
  await refreshStanding(ctx, batch.id);
  return { signatureId: id, seal, pieces };
}

/** Dispatch and acceptance ought to be two people's; a shop of two may let one do both, on the record. */
async function refuseSameHands(ctx: Ctx, number: string): Promise<void> {
  const [shop] = await ctx.tx
    .select({ policy: shops.dispatchAndAcceptance })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  if (shop?.policy !== 'record')
    throw new AppError(
      'not_allowed',
      `You dispatched ${number} yourself. In this shop another person accepts its certificates. An admin can change that in the settings.`,
    );
}

function namedOf({ number, datedOn }: { number: string | null; datedOn: string | null }): {
  number: string;
  datedOn: string;
} {
  if (number !== null && datedOn !== null) return { number, datedOn };
  throw new AppError('conflict', "Enter the certificate's number and date as printed, then sign.", {
    fields: [
      {
        field: number === null ? 'number' : 'datedOn',
        message: number === null ? 'Enter the number as printed.' : 'Enter the date as printed.',
      },
    ],
  });
}

async function wholeFileOf(ctx: Ctx, fileId: string): Promise<{ sha256: string }> {
  const [file] = await ctx.tx
    .select({ name: files.name, state: files.state, sha256: files.sha256 })
    .from(files)
    .where(eq(files.id, fileId));
  if (file?.state !== 'verified' || file.sha256 === null)
    throw new AppError(
      'conflict',
      `${file?.name ?? 'The file'} did not arrive whole, so nobody can sign for it. Ask for it again.`,
    );
  return { sha256: file.sha256 };
}

function refuseFaults({ coverage: asked }: Input, lines: readonly LineStanding[]): void {
  const fields = faultsOfCoverage(asked, lines);
  const [first] = fields;
  if (first) throw new AppError('bad_input', `Not signed. ${first.message}`, { fields });
}

/** Every decision that bears on the covered lines, as the signer saw them. */
async function decidedFor(ctx: Ctx, input: Input, batchId: string): Promise<Sealed['decisions']> {
  const rows = await ctx.tx
    .select({
      requirementId: requirements.id,
      lineId: requirements.lineId,
      lineNo: batchLines.lineNo,
      characteristic: requirements.characteristic,
      limit: requirements.limit,
      unit: requirements.unit,
      decision: decisions,
    })
    .from(requirements)
    .leftJoin(batchLines, eq(batchLines.id, requirements.lineId))
    .leftJoin(
      decisions,
      and(eq(decisions.requirementId, requirements.id), eq(decisions.certificateId, input.certificateId)),
    )
    .where(eq(requirements.batchId, batchId))
    .orderBy(sql`${batchLines.lineNo} nulls first`, asc(requirements.seq), asc(requirements.id));
  const readiness = readinessOf(rows, input.coverage);
  if (readiness.why !== null) throw new AppError('conflict', `Not signed. ${readiness.why}`);

  const bearing = rows.filter((row) => readiness.bearing.includes(row.requirementId));
  return bearing.map(({ decision, lineId: _line, ...requirement }) => {
    if (!decision) throw new Error('an undecided requirement passed as ready');
    const seen = input.decisions.find((one) => one.requirementId === requirement.requirementId);
    if (seen?.version !== decision.version)
      throw changedMeanwhile(`decision about ${requirement.characteristic}`);
    const { stated, verdict, overrideReason, note, decidedBy, decidedAt } = decision;
    return {
      ...requirement,
      stated,
      verdict,
      overrideReason,
      note,
      decidedBy,
      decidedAt: decidedAt.toISOString(),
    };
  });
}

function namesOf(lines: readonly LineStanding[], id: string) {
  const line = lines.find((one) => one.lineId === id);
  if (!line) throw new Error('a line that was checked is gone');
  const { lineId, lineNo, partNumber, partRevision, lotNumber } = line;
  return { lineId, lineNo, partNumber, partRevision, lotNumber };
}

/** What of the batch is on hold at this moment: part of what the signer saw. */
async function heldNow(ctx: Ctx, batchId: string): Promise<Sealed['held']> {
  return ctx.tx
    .select({ number: nonconformances.number, lineNo: batchLines.lineNo, pieces: balances.pieces })
    .from(nonconformances)
    .innerJoin(batchLines, eq(batchLines.id, nonconformances.lineId))
    .innerJoin(
      balances,
      and(
        eq(balances.lotId, nonconformances.lotId),
        eq(balances.place, 'hold'),
        eq(balances.holderId, nonconformances.id),
      ),
    )
    .where(and(eq(nonconformances.batchId, batchId), sql`${balances.pieces} > 0`))
    .orderBy(asc(nonconformances.number));
}
