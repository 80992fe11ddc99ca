import { DrizzleQueryError } from 'drizzle-orm/errors';
import { DatabaseError } from 'pg';
import { ZodError } from 'zod';

import { isAway } from '@/db/is-away';
import type { Problem } from '@/lib/api/shapes';
import { AppError, type ErrorCode } from '@/lib/errors';
import { log } from '@/lib/log';

const STATUS: Record<ErrorCode, number> = {
  bad_input: 400,
  not_signed_in: 401,
  not_allowed: 403,
  not_found: 404,
  conflict: 409,
  gone: 410,
  too_large: 413,
  too_many: 429,
  unavailable: 503,
};

/** The one place where anything thrown becomes an answer. A bug is logged with the request's id and told without its text. */
export function toProblem(error: unknown, requestId: string): Problem {
  const refusal = asRefusal(error);
  if (!refusal) {
    log.error({ error, requestId }, 'a request failed');
    return {
      type: 'about:blank',
      title: `This did not work, and that is our fault. Nothing was changed. Request ${requestId}.`,
      status: 500,
      code: 'bug',
      requestId,
    };
  }
  const { fields, extra } = refusal.details;
  return {
    type: 'about:blank',
    title: refusal.message,
    status: STATUS[refusal.code],
    code: refusal.code,
    requestId,
    ...(fields ? { fields } : {}),
    ...(extra ? { extra } : {}),
  };
}

export function problemResponse(error: unknown, requestId: string): Response {
  const problem = toProblem(error, requestId);
  return Response.json(problem, {
    status: problem.status,
    headers: {
      'content-type': 'application/problem+json',
      'x-request-id': requestId,
      ...(problem.status === 503 ? { 'retry-after': '2' } : {}),
    },
  });
}

function asRefusal(error: unknown): AppError | null {
  if (error instanceof AppError) return error;
  if (error instanceof ZodError) {
    return new AppError('bad_input', 'Some of this cannot be used. Each field says why.', {
      fields: error.issues.map((issue) => ({ field: issue.path.join('.'), message: issue.message })),
    });
  }
  // A line that breaks at the very end leaves open whether it was done, so nothing is claimed.
  if (isAway(error))
    return new AppError(
      'unavailable',
      'The database does not answer just now. Look again in a moment before you repeat what you did.',
    );
  const cause = error instanceof DrizzleQueryError ? error.cause : error;
  return cause instanceof DatabaseError ? fromDatabase(cause) : null;
}

/** Refusals of the database that a race can bring about although the verb looked first. */
function fromDatabase(error: DatabaseError): AppError | null {
  if (error.constraint === 'never_negative')
    return new AppError(
      'conflict',
      'Those pieces are not there any more. Look again, then enter what there is.',
    );
  switch (error.code) {
    case '23505':
      return new AppError('conflict', 'This exists already. Look again before you add it once more.');
    case '40001':
    case '40P01':
      return new AppError('unavailable', 'Two people changed this at the same moment. Try again.');
    default:
      return null;
  }
}
