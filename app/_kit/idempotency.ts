import { and, eq } from 'drizzle-orm';

import type { Tx } from '@/db/client';
import { idempotencyKeys } from '@/db/schema/people';
import { AppError } from '@/lib/errors';

interface KeyedRequest {
  owner: string;
  key: string;
  operation: string;
  requestHash: string;
  now: Date;
}

/**
 * Does the work once per key. The key's row is written first, in the same transaction: a repeat that arrives while the
 * first is under way waits for it at the unique index, then gets its answer. A refusal rolls the key back with all
 * else, so it may be tried again.
 */
export async function once(tx: Tx, request: KeyedRequest, work: () => Promise<unknown>): Promise<unknown> {
  if (request.owner === '') return work();
  if (request.key.length > 200)
    throw new AppError('bad_input', 'The idempotency key is longer than 200 characters.');
  const [mine] = await tx
    .insert(idempotencyKeys)
    .values({
      owner: request.owner,
      key: request.key,
      operation: request.operation,
      requestHash: request.requestHash,
      createdAt: request.now,
    })
    .onConflictDoNothing()
    .returning({ id: idempotencyKeys.id });
  if (!mine) return earlierAnswer(tx, request);

  const result = await work();
  if (!(result instanceof Response))
    await tx
      .update(idempotencyKeys)
      .set({ status: 200, response: result })
      .where(eq(idempotencyKeys.id, mine.id));
  return result;
}

async function earlierAnswer(tx: Tx, request: KeyedRequest): Promise<unknown> {
  const [earlier] = await tx
    .select()
    .from(idempotencyKeys)
    .where(and(eq(idempotencyKeys.owner, request.owner), eq(idempotencyKeys.key, request.key)));
  if (earlier?.operation !== request.operation || earlier.requestHash !== request.requestHash) {
    throw new AppError('conflict', 'This key was used for another request. Use a new key for a new request.');
  }
  // A file, or a secret that is shown once, is not kept to be told again.
  if (earlier.status === null)
    throw new AppError('conflict', 'This was done already. Its answer is shown only once and is not kept.');
  return earlier.response;
}
