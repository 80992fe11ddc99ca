import { env } from '@/lib/env';
import { job } from '@/lib/jobs/job';
import { sendMailQueue } from '@/lib/mail/queued-mail';
import { renderMail } from '@/lib/mail/render-mail';
import { sendMail } from '@/lib/mail/send-mail';

/** Renders one queued mail and hands it to the mail server. A repeat after a broken line carries the same Message-ID. */
export const sendMailJob = job({
  ...sendMailQueue,
  async run(_tools, { mailId, template, to, replyTo, props }) {
    const mail = await renderMail(template, props);
    await sendMail({ ...mail, to, messageId: `${mailId}@${mailDomain()}`, ...(replyTo === null ? {} : { replyTo }) });
  },
});

/** The domain we send from: what stands behind the @ of the sender. */
const mailDomain = (): string => /@([^\s>]+)/.exec(env.MAIL_FROM)?.[1] ?? 'localhost';
