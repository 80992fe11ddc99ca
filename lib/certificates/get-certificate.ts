import { and, asc, desc, eq, isNull, ne, sql } from 'drizzle-orm';

import { batches, batchLines, requirements } from '@/db/schema/batches';
import { certificates, charts, coverage, decisions, signatures } from '@/db/schema/evidence';
import { nonconformances } from '@/db/schema/nonconformances';
import { files } from '@/db/schema/files';
import { balances } from '@/db/schema/lots';
import { processors, shops } from '@/db/schema/organisations';
import { authorize } from '@/lib/auth/authorize';
import { personOf, shopOf, type Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { awayOf } from '@/lib/receipts/away';
import { readLineStanding } from '@/lib/receipts/line-standing';

import { certificateState } from './certificate-state';
import { coverableOf } from './coverable';
import { signedLinesOf } from './decide-requirement';
import { sealOf } from './seal';
import { isSealed } from './sealed-requirements';
import { signingSentence } from './signing-sentence';

/** A certificate beside what its batch must prove: all that the screen of the inspector shows. */
export async function getCertificate(ctx: Ctx, { certificateId }: { certificateId: string }) {
  authorize(ctx, 'certificate.read');
  const [head] = await ctx.tx
    .select({
      certificate: certificates,
      state: certificateState,
      file: files,
      batch: batches,
      processor: processors.name,
    })
    .from(certificates)
    .innerJoin(files, eq(files.id, certificates.fileId))
    .innerJoin(batches, eq(batches.id, certificates.batchId))
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .where(eq(certificates.id, certificateId));
  if (!head) throw notFound('certificate');
  const { certificate, state, file, batch } = head;
  const dispatchedByYou = await separationOf(ctx, batch.dispatchedBy);
  const { id, number, datedOn, sentBy, createdAt, setAsideAt, setAsideReason, version } = certificate;
  return {
    certificate: { id, number, datedOn, sentBy, createdAt, setAsideAt, setAsideReason, version, state },
    file: {
      id: file.id,
      name: file.name,
      mediaType: file.mediaType,
      size: file.size,
      sha256: file.sha256,
      verified: file.state === 'verified' && file.sha256 !== null,
    },
    batch: {
      id: batch.id,
      number: batch.number,
      orderNumber: batch.orderNumber,
      stage: batch.stage,
      processor: head.processor,
      process: batch.process,
      specification: batch.specification,
      specificationRevision: batch.specificationRevision,
      classType: batch.classType,
      pieces: batch.pieces,
    },
    requirements: await judgedRequirements(ctx, { certificateId, batchId: batch.id }),
    lines: await provedLines(ctx, { certificateId, batchId: batch.id }),
    held: await heldOf(ctx, batch.id),
    signatures: await signaturesOf(ctx, certificateId),
    others: await othersOf(ctx, { certificateId, batchId: batch.id }),
    charts: await chartsOf(ctx, batch.id),
    sameFile:
      // Another certificate of the file, or one for several batches: a person took it up as such.
      file.sha256 === null || certificate.place !== null
        ? []
        : await sameFileElsewhere(ctx, { certificateId, batchId: batch.id, sha256: file.sha256 }),
    dispatchedByYou,
    sentence: signingSentence({ dispatchedToo: dispatchedByYou !== null }),
  };
}

interface Of {
  certificateId: string;
  batchId: string;
}

/** What the shop says where the reader's own hands sent the batch out. */
async function separationOf(ctx: Ctx, dispatchedBy: string | null): Promise<'refuse' | 'record' | null> {
  if (dispatchedBy === null || dispatchedBy !== personOf(ctx.actor)) return null;
  const [shop] = await ctx.tx
    .select({ policy: shops.dispatchAndAcceptance })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  return shop?.policy ?? 'refuse';
}

async function judgedRequirements(ctx: Ctx, { certificateId, batchId }: Of) {
  const signed = await signedLinesOf(ctx, certificateId);
  const rows = await ctx.tx
    .select({ requirement: requirements, lineNo: batchLines.lineNo, decision: decisions })
    .from(requirements)
    .leftJoin(batchLines, eq(batchLines.id, requirements.lineId))
    .leftJoin(
      decisions,
      and(eq(decisions.requirementId, requirements.id), eq(decisions.certificateId, certificateId)),
    )
    .where(eq(requirements.batchId, batchId))
    .orderBy(sql`${batchLines.lineNo} nulls first`, asc(requirements.seq), asc(requirements.id));
  return rows.map(({ requirement, lineNo, decision }) => {
    const { id, lineId, characteristic, limit, unit, source, sourceText } = requirement;
    return {
      id,
      lineId,
      lineNo,
      characteristic,
      limit,
      unit,
      source,
      sourceText,
      decision: decision ? { ...decision, sealed: isSealed(requirement, signed) } : null,
    };
  });
}

async function provedLines(ctx: Ctx, { certificateId, batchId }: Of) {
  const standing = await readLineStanding(ctx, batchId);
  const covers = await ctx.tx
    .select({
      lineId: coverage.lineId,
      certificateId: coverage.certificateId,
      number: certificates.number,
      pieces: sql<number>`sum(${coverage.pieces})::int`,
    })
    .from(coverage)
    .innerJoin(certificates, eq(certificates.id, coverage.certificateId))
    .where(eq(certificates.batchId, batchId))
    .groupBy(coverage.lineId, coverage.certificateId, certificates.number);
  return standing.map((line) => {
    const of = covers.filter((one) => one.lineId === line.lineId);
    return {
      id: line.lineId,
      lineNo: line.lineNo,
      lotNumber: line.lotNumber,
      partNumber: line.partNumber,
      partRevision: line.partRevision,
      partName: line.partName,
      pieces: line.pieces,
      inQuarantine: line.inQuarantine,
      onHold: line.onHold,
      away: awayOf(line),
      covered: Math.max(0, line.covered - line.uncoveredAgain),
      coverable: coverableOf(line),
      elsewhere: of
        .filter((one) => one.certificateId !== certificateId)
        .map(({ certificateId: other, number, pieces }) => ({ certificateId: other, number, pieces })),
      here: of.find((one) => one.certificateId === certificateId)?.pieces ?? 0,
    };
  });
}

async function heldOf(ctx: Ctx, batchId: string) {
  return ctx.tx
    .select({
      id: nonconformances.id,
      number: nonconformances.number,
      lineNo: batchLines.lineNo,
      pieces: balances.pieces,
      what: nonconformances.what,
    })
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

async function signaturesOf(ctx: Ctx, certificateId: string) {
  const signed = await ctx.tx
    .select()
    .from(signatures)
    .where(eq(signatures.certificateId, certificateId))
    .orderBy(desc(signatures.signedAt), desc(signatures.id));
  const covers = await ctx.tx
    .select({
      signatureId: coverage.signatureId,
      lineNo: batchLines.lineNo,
      partNumber: sql<string>`coalesce(${batchLines.frozen} ->> 'partNumber', '')`,
      pieces: coverage.pieces,
    })
    .from(coverage)
    .innerJoin(batchLines, eq(batchLines.id, coverage.lineId))
    .where(eq(coverage.certificateId, certificateId))
    .orderBy(asc(batchLines.lineNo));
  return signed.map(({ id, sentence, signerName, signedAt, seal, sealed, fileSha256, reviewSeconds }) => ({
    id,
    sentence,
    signerName,
    signedAt,
    seal,
    fileSha256,
    reviewSeconds,
    intact: sealOf(sealed) === seal,
    coverage: covers
      .filter((one) => one.signatureId === id)
      .map(({ lineNo, partNumber, pieces }) => ({ lineNo, partNumber, pieces })),
  }));
}

async function othersOf(ctx: Ctx, { certificateId, batchId }: Of) {
  return ctx.tx
    .select({
      id: certificates.id,
      number: certificates.number,
      fileName: files.name,
      state: certificateState,
      createdAt: certificates.createdAt,
    })
    .from(certificates)
    .innerJoin(files, eq(files.id, certificates.fileId))
    .where(and(eq(certificates.batchId, batchId), ne(certificates.id, certificateId)))
    .orderBy(desc(certificates.id));
}

async function chartsOf(ctx: Ctx, batchId: string) {
  return ctx.tx
    .select({ id: charts.id, fileId: files.id, fileName: files.name, mediaType: files.mediaType })
    .from(charts)
    .innerJoin(files, eq(files.id, charts.fileId))
    .where(and(eq(charts.batchId, batchId), eq(files.state, 'verified')))
    .orderBy(asc(charts.id));
}

/** The same bytes as a certificate of this or another batch: a second copy, or a paper handed in for the wrong batch. */
async function sameFileElsewhere(ctx: Ctx, { certificateId, batchId, sha256 }: Of & { sha256: string }) {
  const rows = await ctx.tx
    .select({
      certificateId: certificates.id,
      number: certificates.number,
      batchId: batches.id,
      batchNumber: batches.number,
      state: certificateState,
    })
    .from(files)
    .innerJoin(certificates, eq(certificates.fileId, files.id))
    .innerJoin(batches, eq(batches.id, certificates.batchId))
    .where(and(eq(files.sha256, sha256), ne(certificates.id, certificateId), isNull(certificates.place)))
    .orderBy(desc(certificates.id))
    .limit(10);
  return rows.map((row) => ({
    certificateId: row.certificateId,
    number: row.number,
    batchNumber: row.batchNumber,
    sameBatch: row.batchId === batchId,
    signed: row.state === 'signed',
  }));
}
