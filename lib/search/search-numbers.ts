import { sql, type SQL } from 'drizzle-orm';

import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';

import type { HIT_KINDS } from './contract';
import { patternsOf } from './patterns';

interface Hit extends Record<string, unknown> {
  kind: (typeof HIT_KINDS)[number];
  number: string;
  says: string;
  href: string;
}

const EACH = 6;

/**
 * Looks a number up everywhere at once. Each part is a search from the beginning of a number, which its index answers
 * however many rows there are.
 */
export async function searchNumbers(ctx: Ctx, { text }: { text: string }): Promise<{ hits: Hit[] }> {
  authorize(ctx, 'search.use');
  const { rows } = await ctx.tx.execute<Hit>(byCode(text) ?? everywhere(text));
  return { hits: rows };
}

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
  const like = (column: SQL): SQL =>
    sql.join(
      patternsOf(text).map((pattern) => sql`${column} like ${pattern}`),
      sql` or `,
    );
  return sql`
    (select 'Batch' as kind, b.number, p.name || ', ' || replace(b.stage::text, '_', ' ') as says, '/batches/' || b.id as href
      from batches b join processors p on p.id = b.processor_id where ${like(sql`b.number`)} order by b.number limit ${EACH})
    union all (select 'Order', b.order_number, p.name || ', batch ' || b.number, '/batches/' || b.id
      from batches b join processors p on p.id = b.processor_id where ${like(sql`b.order_number`)} order by b.order_number limit ${EACH})
    union all (select 'Part', a.number || ' rev ' || a.revision, a.name, '/parts/' || a.id
      from parts a where a.superseded_at is null and (${like(sql`a.number`)}) order by a.number limit ${EACH})
    union all (select 'Lot', l.number, a.number || ' rev ' || a.revision || ' ' || a.name, '/lots/' || l.id
      from lots l join parts a on a.id = l.part_id where ${like(sql`l.number`)} order by l.number limit ${EACH})
    union all (select 'Certificate', c.number, 'for batch ' || b.number, '/certificates/' || c.id
      from certificates c join batches b on b.id = c.batch_id where ${like(sql`c.number`)} order by c.number limit ${EACH})
    union all (select 'Invoice', i.number, p.name || ', batch ' || b.number, '/invoices/' || i.id
      from invoices i join batches b on b.id = i.batch_id join processors p on p.id = i.processor_id where ${like(sql`i.number`)} order by i.number limit ${EACH})
    union all (select 'Nonconformance', n.number, n.what, '/nonconformances/' || n.id
      from nonconformances n where ${like(sql`n.number`)} order by n.number limit ${EACH})`;
}
