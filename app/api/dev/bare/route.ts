import { sql } from 'drizzle-orm';

import { primary } from '@/db/pools';

/** The least a list could cost: one statement to the database, one JSON answer. `npm run bench` measures against it. */
export async function GET(): Promise<Response> {
  const { rows } = await primary().execute(sql`select 1 as one`);
  return Response.json(rows[0] ?? null);
}
