import { eq, sql } from 'drizzle-orm';

import { certificates, charts, coverage } from '@/db/schema/evidence';
import { files } from '@/db/schema/files';
import { invoices, payments } from '@/db/schema/money';
import type { Ctx } from '@/lib/auth/context';
import { inOwningShop } from '@/lib/files/in-owning-shop';

import type { PaperKind, PortalPaper } from './contract';

const file = { id: files.id, name: files.name, size: files.size, mediaType: files.mediaType };

/** The papers of a batch, newest first, with what the shop has made of each. */
export async function readPapers(ctx: Ctx, { batchId, shopId }: { batchId: string; shopId: string }) {
  const found = [
    ...(await readCertificates(ctx, batchId)),
    ...(await readCharts(ctx, batchId)),
    ...(await readInvoices(ctx, batchId)),
  ];
  const { accepted, paid } = await inOwningShop(ctx, shopId, (inner) => readVerdicts(inner, batchId));
  return found
    .map(({ setAside, approvedAt, ...paper }) => {
      const acceptedPieces = accepted.get(paper.id) ?? null;
      return {
        ...paper,
        acceptedPieces,
        state: stateOf({
          kind: paper.kind,
          setAside,
          approvedAt,
          acceptedPieces,
          isPaid: paid.has(paper.id),
        }),
      };
    })
    .sort((one, other) => other.sentAt.getTime() - one.sentAt.getTime());
}

interface Facts {
  kind: PaperKind;
  setAside: boolean;
  approvedAt: Date | null;
  acceptedPieces: number | null;
  isPaid: boolean;
}

function stateOf({ kind, setAside, approvedAt, acceptedPieces, isPaid }: Facts): PortalPaper['state'] {
  if (kind === 'chart') return 'kept';
  if (kind === 'certificate') {
    if (acceptedPieces !== null) return 'accepted';
    return setAside ? 'set_aside' : 'waiting';
  }
  if (setAside) return 'refused';
  if (isPaid) return 'paid';
  return approvedAt === null ? 'waiting' : 'approved';
}

async function readCertificates(ctx: Ctx, batchId: string) {
  const rows = await ctx.tx
    .select({
      id: certificates.id,
      file,
      number: certificates.number,
      sentBy: certificates.sentBy,
      sentAt: certificates.createdAt,
      setAsideAt: certificates.setAsideAt,
      reason: certificates.setAsideReason,
    })
    .from(certificates)
    .leftJoin(files, eq(files.id, certificates.fileId))
    .where(eq(certificates.batchId, batchId));
  return rows.map(({ setAsideAt, ...row }) => ({
    ...row,
    kind: 'certificate' as const,
    setAside: setAsideAt !== null,
    approvedAt: null,
  }));
}

async function readCharts(ctx: Ctx, batchId: string) {
  const rows = await ctx.tx
    .select({ id: charts.id, file, sentBy: charts.sentBy, sentAt: charts.createdAt })
    .from(charts)
    .leftJoin(files, eq(files.id, charts.fileId))
    .where(eq(charts.batchId, batchId));
  return rows.map((row) => ({
    ...row,
    kind: 'chart' as const,
    number: null,
    reason: null,
    setAside: false,
    approvedAt: null,
  }));
}

async function readInvoices(ctx: Ctx, batchId: string) {
  const rows = await ctx.tx
    .select({
      id: invoices.id,
      file,
      number: invoices.number,
      sentBy: invoices.sentBy,
      sentAt: invoices.createdAt,
      refusedAt: invoices.refusedAt,
      reason: invoices.refusedReason,
      approvedAt: invoices.approvedAt,
    })
    .from(invoices)
    .leftJoin(files, eq(files.id, invoices.fileId))
    .where(eq(invoices.batchId, batchId));
  return rows.map(({ refusedAt, ...row }) => ({
    ...row,
    kind: 'invoice' as const,
    setAside: refusedAt !== null,
  }));
}

/** What stands in the shop's own books: for how many pieces a certificate was signed, and which invoices are paid. */
async function readVerdicts(ctx: Ctx, batchId: string) {
  const signed = await ctx.tx
    .select({ id: coverage.certificateId, pieces: sql<number>`sum(${coverage.pieces})::int` })
    .from(coverage)
    .innerJoin(certificates, eq(certificates.id, coverage.certificateId))
    .where(eq(certificates.batchId, batchId))
    .groupBy(coverage.certificateId);
  const paid = await ctx.tx
    .select({ id: payments.invoiceId })
    .from(payments)
    .innerJoin(invoices, eq(invoices.id, payments.invoiceId))
    .where(sql`${invoices.batchId} = ${batchId} and ${payments.state} = 'succeeded'`);
  return {
    accepted: new Map(signed.map((row) => [row.id, row.pieces])),
    paid: new Set(paid.map((row) => row.id)),
  };
}
