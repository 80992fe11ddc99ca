import { asc, eq, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { files } from '@/db/schema/files';
import { intake, readings } from '@/db/schema/readings';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { matchOrder } from '@/lib/evidence/certificate/match/match-order';

import type { IntakeRow } from './intake-contract';
import { KeptCertificates } from './kept-reading';
import { readOpenOrders, type BatchOrder } from './orders-of-batch';

/** Enough to choose from; what is further down has hardly a word in common. */
const MOST_CANDIDATES = 3;

/** Papers whose batch nobody has named yet, the oldest first, matched anew to the orders that are open now. */
export async function listIntake(ctx: Ctx): Promise<{ rows: z.input<typeof IntakeRow>[] }> {
  authorize(ctx, 'certificate.read');
  const waiting = await ctx.tx
    .select({ intake, fileName: files.name, reading: readings })
    .from(intake)
    .innerJoin(files, eq(files.id, intake.fileId))
    .leftJoin(readings, eq(readings.fileId, intake.fileId))
    .where(isNull(intake.settledAt))
    .orderBy(asc(intake.id));
  const open = waiting.length === 0 ? [] : await readOpenOrders(ctx);
  return {
    rows: waiting.map(({ intake: paper, fileName, reading }) => {
      const read = KeptCertificates.safeParse(reading?.content);
      const [stated] = read.success ? read.data.certificates : [];
      return {
        id: paper.id,
        fileId: paper.fileId,
        fileName,
        addedBy: paper.addedBy,
        createdAt: paper.createdAt,
        state: reading?.state ?? 'waiting',
        fault: reading?.fault ?? null,
        processor: stated?.processor ?? null,
        number: stated?.certificate_number ?? null,
        order: stated?.purchase_order ?? null,
        candidates: stated && read.success ? candidatesOf(stated, open, read.data.file.recognised) : [],
      };
    }),
  };
}

function candidatesOf(
  stated: Parameters<typeof matchOrder>[0],
  open: readonly BatchOrder[],
  isRecognised: boolean,
) {
  const { candidates, matched } = matchOrder(
    stated,
    open.map(({ order }) => order),
    { isRecognised },
  );
  return candidates.slice(0, MOST_CANDIDATES).flatMap(({ order, reasons }) => {
    const batch = open.find((one) => one.order === order);
    if (!batch) return [];
    return [
      {
        batchId: batch.batchId,
        batchNumber: order.batch,
        processor: order.processor.name,
        isClear: matched === order,
        reasons: [...reasons],
      },
    ];
  });
}
