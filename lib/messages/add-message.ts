import { and, eq, inArray, ne } from 'drizzle-orm';

import { batchLines, messages } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';

import type { MessageKind, MessageSide } from './contract';
import { queueNotice } from './queue-notice';

interface Said {
  batchId: string;
  side: MessageSide;
  kind: MessageKind;
  body: string;
  lineId?: string | null;
  answersId?: string | null;
}

/** Adds to a batch's thread, in the shop's rows, and tells the other side by mail. Whether one may is settled before. */
export async function addMessage(ctx: Ctx, said: Said): Promise<{ id: string }> {
  const { batchId, side, kind, body, lineId = null, answersId = null } = said;
  const about = lineId === null ? null : await lineWords(ctx, batchId, lineId);
  const question = await questionOf(ctx, said);
  const id = newId();
  await ctx.tx.insert(messages).values({
    id,
    shopId: shopOf(ctx),
    batchId,
    lineId,
    kind,
    side,
    author: ctx.actor.name,
    body,
    answersId,
    createdAt: ctx.now,
  });
  await recordAudit(ctx, {
    action: `message.${kind}`,
    entity: 'batch',
    entityId: batchId,
    after: { messageId: id, side, body, ...(about === null ? {} : { about }) },
  });
  await queueNotice(ctx, batchId, {
    to: side === 'shop' ? 'processor' : 'shop',
    kind,
    author: ctx.actor.name,
    body,
    about,
    answers: question,
  });
  return { id };
}

async function lineWords(ctx: Ctx, batchId: string, lineId: string): Promise<string> {
  const [line] = await ctx.tx
    .select({ lineNo: batchLines.lineNo, frozen: batchLines.frozen })
    .from(batchLines)
    .where(and(eq(batchLines.id, lineId), eq(batchLines.batchId, batchId)));
  if (!line)
    throw new AppError('bad_input', 'This line is not on the batch.', {
      fields: [{ field: 'lineId', message: 'This line is not on the batch. Choose one that is.' }],
    });
  return line.frozen === null
    ? `line ${line.lineNo}`
    : `line ${line.lineNo}, ${line.frozen.partNumber} ${line.frozen.partRevision}`;
}

/** An answer is to a question or trouble of the other side; anything else may point at one too. */
async function questionOf(
  ctx: Ctx,
  { batchId, side, kind, answersId }: Said,
): Promise<{ author: string; body: string } | null> {
  if (!answersId) {
    if (kind === 'answer')
      throw new AppError('bad_input', 'Say which question this answers.', {
        fields: [{ field: 'answersId', message: 'Say which question this answers.' }],
      });
    return null;
  }
  const [question] = await ctx.tx
    .select({ author: messages.author, body: messages.body })
    .from(messages)
    .where(
      and(
        eq(messages.id, answersId),
        eq(messages.batchId, batchId),
        ne(messages.side, side),
        inArray(messages.kind, ['question', 'trouble']),
      ),
    );
  if (!question)
    throw new AppError('bad_input', 'That question is not on this batch.', {
      fields: [{ field: 'answersId', message: 'That question is not on this batch. Look again.' }],
    });
  return question;
}
