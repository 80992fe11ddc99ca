import { sql } from 'drizzle-orm';
import { connection } from 'next/server';

import { primary } from '@/db/pools';

/** The least a page could cost: drawn anew for each request, with one statement. `npm run bench` measures against it. */
export default async function BarePage() {
  await connection();
  const { rows } = await primary().execute<{ one: number }>(sql`select 1 as one`);
  return <p>{rows[0]?.one}</p>;
}
