import { z } from 'zod';

import { Day, Moment } from '@/lib/api/shapes';
import { STAGES } from '@/lib/batches/stage';
import { Currency, Minor } from '@/lib/money';

/*
 * What each mail is told. Apart from the mails themselves, so that the web server can queue what only the worker
 * renders; parsed when a mail is queued, so that a mail that could not be rendered stops the change that causes it.
 */

const Words = z.string().trim().min(1);

/** Whose clock the mail reads: the shop's, or the person's organisation's. */
const Stated = z.object({ zone: Words, statedAt: Moment });

/** Whom to ring. */
const Contact = z.object({ name: Words, phone: z.string().nullable() });

/** A batch as its two sides name it. */
const OfBatch = Stated.extend({
  shop: Words,
  processor: Words,
  batchNumber: Words,
  orderNumber: Words,
  pieces: z.int().positive(),
  contact: Contact.nullable(),
});

const Line = z.object({
  lineNo: z.int(),
  /** Number and revision: `FL-4418-03 C`. */
  part: Words,
  description: z.string(),
  loadNo: z.int().nullable(),
  pieces: z.int().positive(),
});

const Dispatch = OfBatch.extend({
  /** The process and where it ends: `solution, quench and age to T42`. */
  asked: Words,
  /** With revision and class: `AMS 2770R, class 1`. */
  specification: Words,
  wantedBackOn: Day.nullable(),
  lines: z.array(Line).min(1),
  cautions: z.array(Words),
  note: z.string().nullable(),
  /** The processor's page of this batch; null where the shop has withdrawn its links. */
  url: z.url().nullable(),
  version: z.int().positive(),
  /** Names of the files that go along. */
  attached: z.array(Words).default([]),
});

const Message = OfBatch.extend({
  stage: z.enum(STAGES),
  /** Which side reads it. */
  to: z.enum(['shop', 'processor']),
  kind: z.enum(['question', 'answer', 'trouble', 'note']),
  author: Words,
  body: Words,
  /** The line it is about: `line 3, FL-4431-08 C`. */
  about: z.string().nullable(),
  /** The question that it answers. */
  answers: z.object({ author: Words, body: Words }).nullable(),
  url: z.url().nullable(),
});

export const MAIL_PROPS = {
  dispatch: Dispatch,
  'dispatch-reissued': Dispatch.extend({
    /** What is different from the version before, in words. */
    changes: z.array(Words),
  }),
  'batch-cancelled': OfBatch.extend({ reason: Words }),
  /** A new link to a batch that is under way. */
  'batch-link': OfBatch.extend({
    stage: z.enum(STAGES),
    asked: Words,
    specification: Words,
    wantedBackOn: Day.nullable(),
    url: z.url(),
  }),
  /** A question, an answer or a note, to either side. */
  message: Message,
  trouble: Message,
  remittance: OfBatch.extend({
    stage: z.enum(STAGES),
    invoiceNumber: Words,
    invoiceDatedOn: Day.nullable(),
    currency: Currency,
    /** What is paid for, as the invoice says it. */
    lines: z.array(z.object({ says: Words, pieces: z.int().nullable(), amountMinor: Minor })),
    /** What is not paid, and why; amounts as they stood on the invoice. */
    withheld: z.array(z.object({ says: Words, amountMinor: Minor })),
    paidMinor: Minor,
    paidAt: Moment,
    /** What the transfer carries. */
    reference: Words,
  }),
  'invoice-refused': OfBatch.extend({
    stage: z.enum(STAGES),
    invoiceNumber: Words.nullable(),
    invoiceDatedOn: Day.nullable(),
    currency: Currency,
    /** As it stands on the invoice; null where it was never entered. */
    totalMinor: Minor.nullable(),
    reason: Words,
    /** Where a corrected one is sent; null where the links of the batch have ended. */
    url: z.url().nullable(),
  }),
  invitation: Stated.extend({
    organisation: Words,
    inviter: Words,
    name: Words,
    roles: z.array(Words).min(1),
    url: z.url(),
    expiresAt: Moment,
  }),
  reset: Stated.extend({ name: Words, url: z.url(), expiresAt: Moment }),
  'sign-in': Stated.extend({ name: Words, url: z.url(), expiresAt: Moment }),
} as const;

export type MailTemplate = keyof typeof MAIL_PROPS;
/** What a template's component and subject get. */
export type MailProps<T extends MailTemplate> = z.output<(typeof MAIL_PROPS)[T]>;
/** What a caller hands in: Dates where it says a moment. */
export type MailGiven<T extends MailTemplate> = z.input<(typeof MAIL_PROPS)[T]>;
