import { sql, type SQL } from 'drizzle-orm';
import type { z } from 'zod';

import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';

import { HIT_KINDS, type Hit, type HitKind, type listNumbers as listDeclaration } from './contract';
import { beginsWith } from './matches';

type Row<T> = T & Record<string, unknown>;

/** How many of each kind stand in the list under the field. */
const EACH = 6;

/**
 * Looks a number up everywhere at once. Each part is a search from the beginning of a number, which its index answers
 * however many rows there are.
 */
export async function searchNumbers(
  ctx: Ctx,
  { text }: { text: string },
): Promise<{ hits: Hit[]; more: HitKind[] }> {
  authorize(ctx, 'search.use');
  const { rows } = await ctx.tx.execute<Row<Hit>>(byCode(text) ?? everywhere(text));
  const more = HIT_KINDS.filter((kind) => rows.filter((hit) => hit.kind === kind).length > EACH);
  const hits = rows.filter(
    (hit, at) => rows.slice(0, at).filter((earlier) => earlier.kind === hit.kind).length < EACH,
  );
  return { hits, more };
}

/** All of one kind; the key of a page is the number with the thing's id, as orders and invoices may share a number. */
export async function listNumbers(
  ctx: Ctx,
  { kind, text, after, limit }: z.output<(typeof listDeclaration)['input']>,
) {
  authorize(ctx, 'search.use');
  const { rows } = await ctx.tx.execute<Row<Found>>(ofKind(kind, { text, after, limit: limit + 1 }));
  const { rows: found, next } = toPage<Found>(rows, limit, keyOf);
  return { rows: found.map(({ number, says, href }): Hit => ({ kind, number, says, href })), next };
}

interface Found extends Hit {
  key: string;
  id: string;
}

const keyOf = ({ key, id }: Found): string => `${id} ${key}`;

/** A scanner types the address in the code: of a traveller, or of the lot on a label. */
function byCode(text: string): SQL | null {
  const token = /\/b\/([\w-]{16,})/.exec(text)?.[1];
  if (token !== undefined) return byTraveller(token);
  const lotId = /\/lots\/([\da-f]{8}(?:-[\da-f]{4}){3}-[\da-f]{12})/i.exec(text)?.[1];
  return lotId === undefined ? null : byLabel(lotId);
}

const byLabel = (lotId: string): SQL => sql`
  select 'Lot' as kind, l.number, a.number || ' rev ' || a.revision || ' ' || a.name as says, '/lots/' || l.id as href
  from lots l join parts a on a.id = l.part_id where l.id = ${lotId}`;

const byTraveller = (token: string): SQL => sql`
  select 'Batch' as kind, b.number, p.name as says, '/batches/' || b.id as href
  from batch_links k join batches b on b.id = k.batch_id join processors p on p.id = b.processor_id
  where k.token_hash = ${hashToken(token)}`;

function everywhere(text: string): SQL {
  const parts = HIT_KINDS.map(
    (kind) => sql`(select kind, number, says, href from (${ofKind(kind, { text, limit: EACH + 1 })}) x)`,
  );
  return sql.join(parts, sql` union all `);
}

interface Searched {
  /** Where its things stand, the number by which they are found, and what is said of each. */
  from: SQL;
  number: SQL;
  shown?: SQL;
  id: SQL;
  says: SQL;
  page: string;
  only?: SQL;
}

const OF_BATCH = sql`batches b join processors p on p.id = b.processor_id`;
const KINDS: Record<HitKind, Searched> = {
  Batch: {
    from: OF_BATCH,
    number: sql`b.number`,
    id: sql`b.id`,
    says: sql`p.name || ', ' || replace(b.stage::text, '_', ' ')`,
    page: '/batches/',
  },
  Order: {
    from: OF_BATCH,
    number: sql`b.order_number`,
    id: sql`b.id`,
    says: sql`p.name || ', batch ' || b.number`,
    page: '/batches/',
  },
  Part: {
    from: sql`parts a`,
    number: sql`a.number`,
    shown: sql`a.number || ' rev ' || a.revision`,
    id: sql`a.id`,
    says: sql`a.name`,
    page: '/parts/',
    only: sql`a.superseded_at is null`,
  },
  Lot: {
    from: sql`lots l join parts a on a.id = l.part_id`,
    number: sql`l.number`,
    id: sql`l.id`,
    says: sql`a.number || ' rev ' || a.revision || ' ' || a.name`,
    page: '/lots/',
  },
  Certificate: {
    from: sql`certificates c join batches b on b.id = c.batch_id`,
    number: sql`c.number`,
    id: sql`c.id`,
    says: sql`'for batch ' || b.number`,
    page: '/certificates/',
  },
  Invoice: {
    from: sql`invoices i join batches b on b.id = i.batch_id join processors p on p.id = i.processor_id`,
    number: sql`i.number`,
    id: sql`i.id`,
    says: sql`p.name || ', batch ' || b.number`,
    page: '/invoices/',
  },
  Nonconformance: {
    from: sql`nonconformances n`,
    number: sql`n.number`,
    id: sql`n.id`,
    says: sql`n.what`,
    page: '/nonconformances/',
  },
};

function ofKind(
  kind: HitKind,
  { text, after, limit }: { text: string; after?: string | undefined; limit: number },
): SQL {
  const { from, number, shown = number, id, says, page, only } = KINDS[kind];
  const [, afterId, afterNumber] = /^([\da-f-]{36}) (.*)$/.exec(after ?? '') ?? [];
  const further =
    afterId === undefined ? sql`` : sql`and (${number}, ${id}) > (${afterNumber}, ${afterId}::uuid)`;
  return sql`select ${kind}::text as kind, ${shown} as number, ${says} as says, ${page}::text || ${id} as href, ${number} as key, ${id} as id
    from ${from} where ${beginsWith(number, text)} ${only ? sql`and ${only}` : sql``} ${further} order by ${number}, ${id} limit ${limit}`;
}
