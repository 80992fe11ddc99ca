import { randomUUID } from 'node:crypto';
import { inject } from 'vitest';
import { createDatabase, dropDatabase } from '@/db/cluster';

interface TestDatabase {
  /** As the application connects: bound by row-level security. */
  readonly appUrl: string;
  /** As the owner of the tables: migrations and set-up only. */
  readonly ownerUrl: string;
  drop(): Promise<void>;
}

/** A migrated, empty database of its own for one test file. */
export async function makeDatabase(): Promise<TestDatabase> {
  const superUrl = inject('superUrl');
  const name = `test_${randomUUID().replaceAll('-', '')}`;
  await createDatabase(superUrl, name, inject('template'));

  const urlFor = (role: string) => {
    const url = new URL(superUrl);
    url.username = role;
    url.pathname = `/${name}`;
    return url.href;
  };
  return {
    appUrl: urlFor('lotwright_app'),
    ownerUrl: urlFor('lotwright_owner'),
    drop: () => dropDatabase(superUrl, name),
  };
}
