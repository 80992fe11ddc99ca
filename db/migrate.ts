import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import { Client } from 'pg';
import { grantStatements } from '@/db/grants';

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
    await applyGrants(client);
  } finally {
    await client.end();
  }
}

/** After every migration, so that a new table is out of reach until somebody says who may do what with it. */
async function applyGrants(client: Client): Promise<void> {
  const { rows } = await client.query<{ name: string }>(
    `select tablename as name from pg_tables where schemaname = 'public' order by tablename`,
  );
  await client.query(['begin', ...grantStatements(rows.map(({ name }) => name)), 'commit'].join(';\n'));
}
