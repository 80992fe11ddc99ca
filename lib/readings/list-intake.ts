import { asc, eq, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { files } from '@/db/schema/files';
import { intake, readings } from '@/db/schema/readings';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import type { Candidate, IntakeRow } from './intake-contract';
import { KeptCertificates } from './kept-reading';
import { readOpenOrders, type BatchOrder } from './orders-of-batch';
import { speaksOf } from './speaks-of';

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
        candidates: read.success ? candidatesOf(read.data, open) : [],
      };
    }),
  };
}

/** Batches that any of the certificates in the file speaks of; what speaks for each names its certificate where there are several. */
function candidatesOf(
  { file, certificates: read }: KeptCertificates,
  open: readonly BatchOrder[],
): z.input<typeof Candidate>[] {
  const found = new Map<string, z.input<typeof Candidate>>();
  for (const stated of read) {
    const spoken = speaksOf(
      stated,
      open.map(({ order }) => order),
      { isRecognised: file.recognised },
    );
    for (const { order, isClear, reasons } of spoken) {
      const batch = open.find((one) => one.order === order);
      if (!batch) continue;
      const known = found.get(batch.batchId);
      const name = read.length > 1 ? `${stated.certificate_number ?? 'One without a number'}: ` : '';
      found.set(batch.batchId, {
        batchId: batch.batchId,
        batchNumber: order.batch,
        processor: order.processor.name,
        isClear: isClear || known?.isClear === true,
        reasons: [
          ...(known?.reasons ?? []),
          ...reasons.map((reason, at) => (at === 0 ? name + reason : reason)),
        ],
      });
    }
  }
  return [...found.values()].toSorted((a, b) => Number(b.isClear) - Number(a.isClear));
}
