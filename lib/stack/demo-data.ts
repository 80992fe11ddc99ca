import { existsSync } from 'node:fs';
import { Client } from 'pg';
import { CannotStart } from '@/db/cannot-start';
import { createDatabase, dropDatabase } from '@/db/cluster';
import { prepareDatabase } from './prepare-database';
import { runToEnd } from './run-to-end';

const SEED = 'db/seed/seed.ts';
/** Kept as the database's own comment: it is outside the data, and goes when the database goes. */
const LOADING = 'demo data: loading';
const LOADED = 'demo data: loaded';

interface DemoOptions {
  readonly superUrl: string;
  readonly ownerUrl: string;
  readonly env: Readonly<Record<string, string>>;
  readonly report: (line: string) => void;
  readonly onStart: (pid: number) => void;
}

/** Loads the story into an empty database. A story that was interrupted half way is thrown away and told again. */
export async function loadDemoData({ superUrl, ownerUrl, env, report, onStart }: DemoOptions): Promise<void> {
  const database = new URL(ownerUrl).pathname.slice(1);
  const state = await demoState(superUrl, database);
  if (state === 'present') return;
  if (!existsSync(SEED)) return report(`No demo data: ${SEED} does not exist.`);
  if (state === 'interrupted') {
    report('The demo data was interrupted while being loaded; starting that anew.');
    await resetDatabase(superUrl, ownerUrl);
  }

  report('Loading the demo data …');
  await setState(superUrl, { database, state: LOADING });
  const { code } = await runToEnd(['--import', 'tsx', SEED], { env, output: 'show', onStart });
  if (code !== 0) throw new CannotStart(`The demo data could not be loaded (${SEED}); its message is above.`);
  await setState(superUrl, { database, state: LOADED });
}

export async function resetDatabase(superUrl: string, ownerUrl: string): Promise<void> {
  const database = new URL(ownerUrl).pathname.slice(1);
  await dropDatabase(superUrl, database);
  await createDatabase(superUrl, database);
  await prepareDatabase(ownerUrl);
}

async function demoState(superUrl: string, database: string): Promise<'absent' | 'interrupted' | 'present'> {
  return within(superUrl, database, async (client) => {
    const { rows } = await client.query<{ comment: string | null; has_shops: boolean }>(
      `select shobj_description(oid, 'pg_database') as comment, to_regclass('public.shops') is not null as has_shops
       from pg_database where datname = current_database()`,
    );
    const [found] = rows;
    if (found?.comment === LOADING) return 'interrupted';
    if (!found?.has_shops) return 'absent';
    const { rowCount } = await client.query('select from shops limit 1');
    return rowCount === 0 ? 'absent' : 'present';
  });
}

async function setState(
  superUrl: string,
  { database, state }: { database: string; state: string },
): Promise<void> {
  await within(superUrl, database, (client) =>
    client.query(`comment on database "${database}" is '${state}'`),
  );
}

async function within<T>(
  superUrl: string,
  database: string,
  work: (client: Client) => Promise<T>,
): Promise<T> {
  const url = new URL(superUrl);
  url.pathname = `/${database}`;
  const client = new Client({ connectionString: url.href });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}
