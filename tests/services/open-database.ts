import { afterAll, beforeAll } from 'vitest';

import { connect, type Db } from '@/db/client';

import { makeDatabase } from './database';

/** A database for the tests of this file, as the application sees it and as its owner does. Filled before the first test. */
export function openDatabase(): { db: Db; owner: Db } {
  const opened = {} as { db: Db; owner: Db };
  let close = () => Promise.resolve();
  beforeAll(async () => {
    const database = await makeDatabase();
    const [app, owner] = [connect(database.appUrl), connect(database.ownerUrl, 4)];
    Object.assign(opened, { db: app.db, owner: owner.db });
    close = async () => {
      await Promise.all([app.pool.end(), owner.pool.end()]);
      await database.drop();
    };
  });
  afterAll(() => close());
  return opened;
}
