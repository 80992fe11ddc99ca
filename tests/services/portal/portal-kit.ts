import { sql } from 'drizzle-orm';

import type { Db } from '@/db/client';
import { files } from '@/db/schema/files';
import { newId } from '@/lib/ids';
import type { FilePurpose, FileState } from '@/lib/files/purpose';

import { makeDispatchedBatch } from '../../factories/batches';
import { makeWorld, TODAY, type World } from '../../factories/world';

/** A shop with a batch that is on its way to its processor. */
export async function makeSent(
  base: { db: Db; owner: Db },
  given: Parameters<typeof makeDispatchedBatch>[2] = {},
) {
  const world = await makeWorld(base.db, base.owner);
  const batch = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId, given));
  return { world, batch, batchId: batch.id };
}

/** Mails that wait to go, as far as tests look at them. */
export async function queuedMails(
  owner: Db,
  shopId: string,
): Promise<{ template: string; to: string[]; props: Record<string, unknown>; replyTo: string | null }[]> {
  const { rows } = await owner.execute<{
    data: { template: string; to: string[]; props: Record<string, unknown>; replyTo: string | null };
  }>(
    sql`select data from pgboss.job where name = 'send-mail' and data->>'shopId' = ${shopId} order by created_on`,
  );
  return rows.map((row) => row.data);
}

/** The record of a file that a processor sent; its bytes are nobody's concern here. */
export async function makeSentFile(
  owner: Db,
  world: World,
  given: { purpose: FilePurpose; batchId: string | null; state?: FileState; processorId?: string },
): Promise<string> {
  const id = newId();
  await owner.insert(files).values({
    id,
    shopId: world.shopId,
    batchId: given.batchId,
    processorId: given.processorId ?? world.processorId,
    purpose: given.purpose,
    name: `${id.slice(-4)}.pdf`,
    mediaType: 'application/pdf',
    size: 100,
    sha256: id.replaceAll('-', '').padEnd(64, '0'),
    storageKey: `files/${id}`,
    state: given.state ?? 'verified',
    uploadedBy: 'Test Processor',
    createdAt: TODAY,
  });
  return id;
}

/** Of a refusal: its code and, by field, what it says. */
export async function refusalOf(
  work: Promise<unknown>,
): Promise<{ code: string; message: string; fields: string[] }> {
  try {
    await work;
  } catch (error) {
    const { code, message, details } = error as {
      code: string;
      message: string;
      details?: { fields?: { field: string }[] };
    };
    return { code, message, fields: (details?.fields ?? []).map((one) => one.field) };
  }
  throw new Error('it was not refused');
}
