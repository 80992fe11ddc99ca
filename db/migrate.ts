import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate as applyMigrations } from 'drizzle-orm/node-postgres/migrator';
import path from 'node:path';
import pg from 'pg';

import { installQueues } from '@/lib/jobs/queue';

import { grantStatements } from './grants';

/** Brings the database at `ownerUrl` to the newest schema, grants and job queues. Safe to repeat. */
export async function migrate(ownerUrl: string): Promise<void> {
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    // Two starts at once: the second waits and then finds nothing to do.
    await client.query('select pg_advisory_lock(4600)');
    await applyMigrations(drizzle(client), { migrationsFolder: path.join(import.meta.dirname, '..', 'drizzle') });
    const { rows } = await client.query<{ tablename: string }>(`select tablename from pg_tables where schemaname = 'public'`);
    await client.query('begin');
    for (const statement of grantStatements(rows.map((row) => row.tablename))) await client.query(statement);
    await client.query('commit');
    await installQueues(ownerUrl);
  } finally {
    await client.end();
  }
}
