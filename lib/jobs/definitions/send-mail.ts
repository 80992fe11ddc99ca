import { env } from '@/lib/env';
import { job } from '@/lib/jobs/job';
import { sendMailQueue } from '@/lib/mail/queued-mail';
import { readAttachments } from '@/lib/mail/read-attachments';
import { renderMail } from '@/lib/mail/render-mail';
import { sendMail } from '@/lib/mail/send-mail';

/** Renders one queued mail and hands it to the mail server. A repeat after a broken line carries the same Message-ID. */
export const sendMailJob = job({
  ...sendMailQueue,
  async run(tools, { mailId, template, to, replyTo, shopId, attach, props }) {
    const mail = await renderMail(template, props);
    const attachments = await readAttachments(tools, { shopId, attach });
    await sendMail({
      ...mail,
      to,
      attachments,
      messageId: `${mailId}@${mailDomain()}`,
      ...(replyTo === null ? {} : { replyTo }),
    });
  },
});

/** The domain we send from: what stands behind the @ of the sender. */
const mailDomain = (): string => /@([^\s>]+)/.exec(env.MAIL_FROM)?.[1] ?? 'localhost';
