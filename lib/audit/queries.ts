import { and, asc, desc, eq, lt, sql, type SQL } from 'drizzle-orm';
import type { z } from 'zod';

import { auditEntries } from '@/db/schema/audit';
import { shops } from '@/db/schema/organisations';
import { memberships, users } from '@/db/schema/people';
import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';

import type { listAudit as declaration } from './contract';

type Asked = z.output<(typeof declaration)['input']>;

/** Newest first; the number in the chain is the key of the page. */
export async function listAudit(ctx: Ctx, asked: Asked) {
  authorize(ctx, 'audit.read');
  const rows = await ctx.tx
    .select({
      seq: auditEntries.seq,
      at: auditEntries.at,
      actorKind: auditEntries.actorKind,
      actorName: auditEntries.actorName,
      address: auditEntries.address,
      action: auditEntries.action,
      entity: auditEntries.entity,
      entityId: auditEntries.entityId,
      called: calledToday,
      before: sql<Record<string, unknown> | null>`${auditEntries.before}`,
      after: sql<Record<string, unknown> | null>`${auditEntries.after}`,
      hash: auditEntries.hash,
    })
    .from(auditEntries)
    .where(and(eq(auditEntries.shopId, shopOf(ctx)), ...conditions(ctx, asked)))
    .orderBy(desc(auditEntries.seq))
    .limit(asked.limit + 1);
  return toPage(rows, asked.limit, (row) => String(row.seq));
}

function conditions(ctx: Ctx, { after, entity, entityId, personId, from, to }: Asked): (SQL | undefined)[] {
  const key = after === undefined ? null : Number(after);
  if (key !== null && !Number.isSafeInteger(key))
    throw new AppError('bad_input', 'This is not a place in the list.', {
      fields: [{ field: 'after', message: 'Use what `next` said.' }],
    });
  const startOf = (day: string) =>
    sql`(${day}::date::timestamp at time zone (select zone from shops where id = ${shopOf(ctx)}))`;
  return [
    key === null ? undefined : lt(auditEntries.seq, key),
    entity === undefined ? undefined : eq(auditEntries.entity, entity),
    entityId === undefined ? undefined : eq(auditEntries.entityId, entityId),
    personId === undefined ? undefined : eq(auditEntries.actorId, personId),
    from === undefined ? undefined : sql`${auditEntries.at} >= ${startOf(from)}`,
    to === undefined ? undefined : sql`${auditEntries.at} < ${startOf(to)} + interval '1 day'`,
  ];
}

/** Looked up for the rows of one page only: what the reader knows a thing by. */
const calledToday = sql<string | null>`case ${auditEntries.entity}
  when 'batch' then (select number from batches where id = ${auditEntries.entityId})
  when 'lot' then (select number from lots where id = ${auditEntries.entityId})
  when 'part' then (select number || ' ' || revision from parts where id = ${auditEntries.entityId})
  when 'assembly' then (select name from assemblies where id = ${auditEntries.entityId})
  when 'certificate' then (select number from certificates where id = ${auditEntries.entityId})
  when 'nonconformance' then (select number from nonconformances where id = ${auditEntries.entityId})
  when 'invoice' then (select number from invoices where id = ${auditEntries.entityId})
  when 'processor' then (select name from processors where id = ${auditEntries.entityId})
  when 'person' then (select name from users where id = ${auditEntries.entityId})
  when 'file' then (select name from files where id = ${auditEntries.entityId})
  when 'location' then (select name from locations where id = ${auditEntries.entityId})
  when 'shop' then (select name from shops where id = ${auditEntries.entityId})
end`;

/** Kinds are found by jumping from one to the next in the index, however long the trail is. */
export async function listAuditFilters(ctx: Ctx) {
  authorize(ctx, 'audit.read');
  const shopId = shopOf(ctx);
  const [shop] = await ctx.tx.select({ zone: shops.zone }).from(shops).where(eq(shops.id, shopId));
  const people = await ctx.tx
    .select({ id: users.id, name: users.name })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(memberships.shopId, shopId))
    .orderBy(asc(users.name));
  const { rows } = await ctx.tx.execute<{ entity: string }>(sql`
    with recursive kind(entity) as (
      (select entity from audit_entries where shop_id = ${shopId} order by entity limit 1)
      union all
      select (select e.entity from audit_entries e where e.shop_id = ${shopId} and e.entity > kind.entity order by e.entity limit 1) from kind where kind.entity is not null
    ) select entity from kind where entity is not null`);
  return { zone: shop?.zone ?? 'UTC', people, entities: rows.map((row) => row.entity) };
}
