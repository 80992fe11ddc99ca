import { MAIL_PROPS, type MailGiven, type MailTemplate } from '@/emails/mail-props';
import type { Ctx } from '@/lib/auth/context';
import { newId } from '@/lib/ids';
import { enqueue } from '@/lib/jobs/queue';

import { sendMailQueue } from './queued-mail';
import { shopReplyAddress } from './shop-reply-address';

interface MailToQueue<T extends MailTemplate> {
  template: T;
  to: string | readonly string[];
  props: MailGiven<T>;
  /** Who reads an answer to this mail. Left out: whoever of the shop causes it, else its first admin. */
  replyTo?: string | null;
  /** Ids of verified files of the shop. */
  attach?: readonly string[];
}

/**
 * Queues a mail in the transaction that causes it, so that it goes if and only if that commits. In a shop's
 * transaction it goes in the shop's name and answers reach the shop; at the door it belongs to nobody.
 */
export async function queueMail<T extends MailTemplate>(
  ctx: Pick<Ctx, 'tx' | 'tenant' | 'actor'>,
  mail: MailToQueue<T>,
): Promise<void> {
  const shopId = ctx.tenant.kind === 'shop' ? ctx.tenant.shopId : null;
  const replyTo = mail.replyTo === undefined ? await shopReplyAddress(ctx) : mail.replyTo;
  await enqueue(ctx, sendMailQueue, {
    shopId,
    mailId: newId(),
    template: mail.template,
    to: [mail.to].flat(),
    replyTo,
    attach: [...(mail.attach ?? [])],
    props: MAIL_PROPS[mail.template].parse(mail.props) as Record<string, unknown>,
  });
}
