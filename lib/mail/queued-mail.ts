import { z } from 'zod';

import { MAIL_PROPS, type MailTemplate } from '@/emails/mail-props';

const TEMPLATES = Object.keys(MAIL_PROPS) as [MailTemplate, ...MailTemplate[]];

/** One mail as it waits in the queue. */
export const QueuedMail = z.object({
  /** The shop in whose name it goes; null for what belongs to no shop (a processor's sign-in link). */
  shopId: z.uuid().nullable(),
  /** Made when it is queued: every attempt, and every later repeat by an admin, carries the same Message-ID. */
  mailId: z.uuid(),
  template: z.enum(TEMPLATES),
  to: z.array(z.email()).min(1),
  replyTo: z.email().nullable(),
  /** Kept files of the shop that go along. */
  attach: z.array(z.uuid()).default([]),
  props: z.record(z.string(), z.unknown()),
});
export type QueuedMail = z.output<typeof QueuedMail>;

/** The queue, apart from the job that works it off: the web server queues, only the worker renders and sends. */
export const sendMailQueue = { name: 'send-mail', payload: QueuedMail } as const;
