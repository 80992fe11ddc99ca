import { and, asc, eq, sql } from 'drizzle-orm';

import { memberships, users } from '@/db/schema/people';
import type { Ctx } from '@/lib/auth/context';
import { env } from '@/lib/env';
import { queueMail } from '@/lib/mail/queue-mail';
import { batchForMail, type BatchForMail } from '@/lib/portal/batch-for-mail';
import { openBatchUrl } from '@/lib/portal/open-batch-url';
import { ofBatchProps } from '@/lib/portal/queue-batch-mail';

import type { MessageKind, MessageSide } from './contract';

interface Notice {
  to: MessageSide;
  kind: MessageKind;
  author: string;
  body: string;
  about: string | null;
  answers: { author: string; body: string } | null;
}

/** The mail that tells one side what the other wrote. Its reply address is whoever wrote, so that an answer is not lost. */
export async function queueNotice(ctx: Ctx, batchId: string, notice: Notice): Promise<void> {
  const batch = await batchForMail(ctx, batchId);
  const toShop = notice.to === 'shop';
  const to = toShop ? await shopReaders(ctx, batch) : [batch.deskEmail];
  if (to.length === 0) return;
  await queueMail(ctx, {
    template: notice.kind === 'trouble' ? 'trouble' : 'message',
    to,
    ...(toShop ? { replyTo: batch.deskEmail } : {}),
    props: {
      ...ofBatchProps(ctx, batch),
      ...notice,
      stage: batch.stage,
      url: toShop ? `${env.APP_URL}/batches/${batchId}#messages` : await openBatchUrl(ctx, batch),
    },
  });
}

/** Whoever sent the batch; where they have left, everybody who could have. */
async function shopReaders(ctx: Ctx, batch: BatchForMail): Promise<string[]> {
  const people = await ctx.tx
    .select({ id: users.id, email: users.email })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(
        eq(memberships.active, true),
        eq(users.active, true),
        sql`${memberships.roles} && array['lead', 'admin']`,
      ),
    )
    .orderBy(asc(memberships.id));
  const sender = people.find((person) => person.id === batch.dispatchedBy);
  return sender ? [sender.email] : people.map((person) => person.email);
}
