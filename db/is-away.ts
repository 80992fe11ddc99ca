import { DrizzleQueryError } from 'drizzle-orm/errors';

/** Of the network, and of a server that stops, starts or has no connection left (PostgreSQL, appendix A: classes 08, 53, 57). */
const CODES = new Set([
  ...['ECONNREFUSED', 'ECONNRESET', 'EPIPE', 'ETIMEDOUT'],
  ...['08000', '08001', '08003', '08004', '08006', '53300', '57P01', '57P02', '57P03'],
]);
/** The driver has no codes of its own. */
const WORDS =
  /connection terminated|timeout exceeded when trying to connect|client has encountered a connection error|client was closed and is not queryable/i;

/** Whether an error says no more than that the database is not there just now: restarting, say, or its machine is. */
export function isAway(error: unknown): boolean {
  if (error instanceof DrizzleQueryError) return isAway(error.cause);
  if (!(error instanceof Error)) return false;
  const { code } = error as NodeJS.ErrnoException;
  return (code !== undefined && CODES.has(code)) || WORDS.test(error.message);
}
