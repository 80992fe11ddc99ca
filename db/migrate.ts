import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import { Client } from 'pg';

const FOLDER = 'drizzle';
/** Any number will do, as long as it is always this one. */
const LOCK = 4_632_001;

/** Applies what is missing. Several machines may start at once: the second waits and finds nothing left to do. */
export async function applyMigrations(ownerUrl: string): Promise<void> {
  if (!existsSync(join(FOLDER, 'meta', '_journal.json'))) return;
  const client = new Client({ connectionString: ownerUrl, connectionTimeoutMillis: 15_000 });
  await client.connect();
  try {
    await client.query('select pg_advisory_lock($1)', [LOCK]);
    await migrate(drizzle(client), { migrationsFolder: FOLDER });
  } finally {
    await client.end();
  }
}
