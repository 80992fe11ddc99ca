import { and, eq, sql, type SQL } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { certificates } from '@/db/schema/evidence';
import { files } from '@/db/schema/files';
import { processors } from '@/db/schema/organisations';
import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import { certificateState } from './certificate-state';
import type { listCertificates as declaration } from './contract';

const isDone = sql<boolean>`(${certificateState} <> 'waiting')`;

/** What waits to be proved first. The key of a page says in which of the two halves it ended. */
export async function listCertificates(
  ctx: Ctx,
  { after, limit, batchId, state }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'certificate.read');
  const rows = await ctx.tx
    .select({
      id: certificates.id,
      number: certificates.number,
      datedOn: certificates.datedOn,
      state: certificateState,
      fileId: files.id,
      fileName: files.name,
      fileVerified: sql<boolean>`(${files.state} = 'verified')`,
      sentBy: certificates.sentBy,
      createdAt: certificates.createdAt,
      batchId: certificates.batchId,
      batchNumber: batches.number,
      stage: batches.stage,
      processor: processors.name,
      process: batches.process,
      pieces: batches.pieces,
      coveredPieces: sql<number>`coalesce((select sum(c.pieces) from coverage c where c.certificate_id = ${certificates.id}), 0)::int`,
      requirements: sql<number>`(select count(*)::int from requirements r where r.batch_id = ${certificates.batchId})`,
      decided: sql<number>`(select count(*)::int from decisions d where d.certificate_id = ${certificates.id})`,
    })
    .from(certificates)
    .innerJoin(files, eq(files.id, certificates.fileId))
    .innerJoin(batches, eq(batches.id, certificates.batchId))
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .where(
      and(
        batchId === undefined ? undefined : eq(certificates.batchId, batchId),
        state === undefined ? undefined : sql`${certificateState} = ${state}`,
        after === undefined ? undefined : isAfter(after),
      ),
    )
    .orderBy(isDone, sql`${certificates.id} desc`)
    .limit(limit + 1);
  return toPage(rows, limit, (row) => `${row.state === 'waiting' ? 'waiting' : 'done'}.${row.id}`);
}

function isAfter(key: string): SQL {
  const [half, id] = key.split('.');
  if (id === undefined || !/^[0-9a-f-]{36}$/.test(id)) return sql`false`;
  return half === 'waiting'
    ? sql`(${isDone} or ${certificates.id} < ${id})`
    : sql`(${isDone} and ${certificates.id} < ${id})`;
}
