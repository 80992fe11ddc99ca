import { asc, eq } from 'drizzle-orm';

import { batchLines, messages } from '@/db/schema/batches';
import type { Ctx } from '@/lib/auth/context';

import type { MessageSide } from './contract';

/** The messages of a batch and the lines they may be about, by whichever side's own eyes. */
export async function readThread(ctx: Ctx, batchId: string) {
  const said = await ctx.tx
    .select({
      id: messages.id,
      kind: messages.kind,
      side: messages.side,
      author: messages.author,
      body: messages.body,
      lineId: messages.lineId,
      answersId: messages.answersId,
      createdAt: messages.createdAt,
    })
    .from(messages)
    .where(eq(messages.batchId, batchId))
    .orderBy(asc(messages.createdAt), asc(messages.id));
  const lines = await ctx.tx
    .select({ id: batchLines.id, lineNo: batchLines.lineNo, frozen: batchLines.frozen })
    .from(batchLines)
    .where(eq(batchLines.batchId, batchId))
    .orderBy(asc(batchLines.lineNo));
  return {
    messages: said.map((message) => ({ ...message, side: message.side as MessageSide })),
    lines: lines.map(({ id, lineNo, frozen }) => ({
      id,
      lineNo,
      part: frozen === null ? '' : `${frozen.partNumber} ${frozen.partRevision}`,
    })),
  };
}
