import { sql } from 'drizzle-orm';

import type { PiecesAt } from '@/lib/parts/contract';

// For selects from `lots`. The outer table is named in words: in a select from one table Drizzle strips the table's
// name off its columns, and `id` inside the inner query would be another id.

/** Where the pieces of a lot are, summed by place, in the order of the way. */
export const placesOfLot = sql<
  PiecesAt[]
>`(select coalesce(json_agg(json_build_object('place', x.place, 'pieces', x.pieces) order by x.place), '[]')
  from (select b.place, sum(b.pieces)::int as pieces from balances b where b.lot_id = lots.id and b.pieces > 0 group by b.place) x)`;

/** How many pieces were made: the sum over all places, since none is ever lost sight of. */
export const madeOfLot = sql<number>`(select coalesce(sum(b.pieces), 0)::int from balances b where b.lot_id = lots.id)`;
