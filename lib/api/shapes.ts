import { z } from 'zod';

/** A point in time; the server hands in a Date, the wire carries ISO 8601 in UTC. */
export const Moment = z
  .union([z.string(), z.date()])
  .transform((value) => (typeof value === 'string' ? value : value.toISOString()))
  .pipe(z.iso.datetime());

/** A calendar day without a time: `2026-04-16`. */
export const Day = z.iso.date('Enter a day, as 2026-04-16.');

export const Id = z.uuid();

/** A count of pieces a person enters: a whole number, 1 or more. */
export const Pieces = z
  .int('Enter a whole number of pieces.')
  .min(1, 'Enter 1 or more.')
  .max(1_000_000, 'Enter 1,000,000 or less.');

/** A file or another format that is not JSON. */
export const BINARY = z.any().meta({ description: 'binary' });

/** Query of a list that pages by key: rows after `after`, at most `limit`. */
export const PageQuery = z.object({
  after: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});

/** One page of a list; `next` is the key to ask for the following one with, null on the last. */
export const pageOf = <Row extends z.ZodType>(row: Row) =>
  z.object({ rows: z.array(row), next: z.string().nullable() });

/** A write that has nothing to tell but that it was done. */
export const Done = z.object({ done: z.literal(true) });

/** The error form of every refusal (RFC 9457). */
export const Problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  code: z.string(),
  requestId: z.string(),
  fields: z.array(z.object({ field: z.string(), message: z.string() })).optional(),
  extra: z.record(z.string(), z.unknown()).optional(),
});
export type Problem = z.infer<typeof Problem>;
