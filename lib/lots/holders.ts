import { sql } from 'drizzle-orm';

import type { Stage } from '@/lib/batches/stage';
import type { Ctx } from '@/lib/auth/context';
import { NO_HOLDER } from '@/lib/ids';

import type { Holder } from './contract';

type HolderRow = {
  spot: string;
  kind: Holder['kind'];
  id: string;
  says: string;
  seq: number | null;
  stage: Stage | null;
};

/** What the holders of pieces are called, by the id that the ledger keeps. A line that was taken out again has no name. */
export async function namesOfHolders(
  ctx: Pick<Ctx, 'tx'>,
  holderIds: readonly (string | null)[],
): Promise<ReadonlyMap<string, Holder>> {
  const ids = [...new Set(holderIds.filter((id): id is string => id !== null && id !== NO_HOLDER))];
  if (ids.length === 0) return new Map();
  const { rows } = await ctx.tx.execute<HolderRow>(sql`
    select s.id as spot, 'step' as kind, s.id, s.process::text as says, s.seq, null::text as stage from route_steps s where s.id in ${ids}
    union all select l.id, 'batch', b.id, b.number, l.line_no, b.stage::text from batch_lines l join batches b on b.id = l.batch_id where l.id in ${ids}
    union all select n.id, 'nonconformance', n.id, n.number, null, null from nonconformances n where n.id in ${ids}
    union all select o.id, 'location', o.id, o.name, null, null from locations o where o.id in ${ids}
    union all select a.id, 'assembly', a.id, a.name, null, null from assemblies a where a.id in ${ids}`);
  return new Map(rows.map(({ spot, ...holder }) => [spot, holder]));
}
