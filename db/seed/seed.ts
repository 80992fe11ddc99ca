import { subDays } from 'date-fns';
import { drizzle } from 'drizzle-orm/node-postgres';
import pg from 'pg';

import { env } from '@/lib/env';

import { seedOrganisations } from './organisations';

/** Tells the demonstration's story up to today, into an empty database. Dates are relative to the day it is told. */
async function main(): Promise<void> {
  const today = new Date();
  const pool = new pg.Pool({ connectionString: env.DATABASE_OWNER_URL, max: 2 });
  try {
    await seedOrganisations(drizzle(pool), { since: subDays(today, 365), today });
  } finally {
    await pool.end();
  }
}

await main();
