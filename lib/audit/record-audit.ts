import { auditEntries } from '@/db/schema/audit';
import { personOf, shopOf, type Actor, type Ctx } from '@/lib/auth/context';

/** What happened to one thing. `before` and `after` hold the changed fields, as values that JSON can say. */
export interface AuditRecord {
  /** `thing.verb`: `batch.dispatch`. */
  action: string;
  /** The kind of thing: `batch`, `lot`, `invoice` … */
  entity: string;
  entityId: string;
  before?: Record<string, unknown>;
  after?: Record<string, unknown>;
}

/** Adds an entry to the shop's chain, in the transaction of the change it tells of. */
export async function recordAudit(ctx: Ctx, record: AuditRecord): Promise<void> {
  await ctx.tx.insert(auditEntries).values({
    shopId: shopOf(ctx),
    at: ctx.now,
    actorKind: ctx.actor.kind,
    actorId: actorId(ctx.actor),
    actorName: ctx.actor.name,
    address: ctx.address,
    requestId: ctx.requestId,
    action: record.action,
    entity: record.entity,
    entityId: record.entityId,
    before: record.before ?? null,
    after: record.after ?? null,
  });
}

function actorId(actor: Actor): string {
  if (actor.kind === 'link') return actor.linkId;
  if (actor.kind === 'token') return actor.tokenId;
  return personOf(actor) ?? actor.name;
}
