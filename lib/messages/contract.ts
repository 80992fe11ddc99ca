import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id, Moment } from '@/lib/api/shapes';

export const MESSAGE_KINDS = ['question', 'answer', 'trouble', 'note'] as const;
export type MessageKind = (typeof MESSAGE_KINDS)[number];
export type MessageSide = 'shop' | 'processor';

export const MessageBody = z
  .string()
  .trim()
  .min(1, 'Write something first.')
  .max(4000, 'Write 4000 characters or less.');

/** One thing that was said on a batch, by either side. */
export const MessageView = z.object({
  id: Id,
  kind: z.enum(MESSAGE_KINDS),
  side: z.enum(['shop', 'processor']),
  author: z.string(),
  body: z.string(),
  lineId: Id.nullable(),
  /** The question that it answers. */
  answersId: Id.nullable(),
  createdAt: Moment,
});
export type MessageView = z.output<typeof MessageView>;

/** What either side writes. Trouble is the processor's to report, with a verb of its own. */
export const NewMessage = z.object({
  batchId: Id,
  kind: z.enum(['question', 'answer', 'note']),
  body: MessageBody,
  /** The line it is about, where it is about one. */
  lineId: Id.nullable().default(null),
  /** For an answer: the question or trouble of the other side. */
  answersId: Id.nullable().default(null),
});
export type NewMessage = z.output<typeof NewMessage>;

export const Thread = z.object({
  /** Oldest first, as one reads. */
  messages: z.array(MessageView),
  lines: z.array(z.object({ id: Id, lineNo: z.int(), part: z.string() })),
  /** What the other side is called. */
  other: z.string(),
  zone: z.string(),
  /** Why nothing more can be written, or null. */
  closed: z.string().nullable(),
});
export type Thread = z.output<typeof Thread>;

export const listMessages = declare({
  id: 'listMessages',
  method: 'get',
  path: '/batches/{batchId}/messages',
  summary: 'What shop and processor have said about a batch',
  side: 'shop',
  permission: 'batch.read',
  input: z.object({ batchId: Id }),
  response: Thread,
});

export const writeToProcessor = declare({
  id: 'writeToProcessor',
  method: 'post',
  path: '/batches/{batchId}/messages',
  summary: 'Ask the processor, answer it, or leave a note; it goes out as a mail too',
  side: 'shop',
  permission: 'batch.message',
  input: NewMessage,
  response: z.object({ id: Id }),
});
