import { applyMigrations } from '@/db/migrate';
import { installQueues } from '@/lib/jobs/queue';

/** Brings a database to what this version of the program expects: tables, grants and job queues. Safe to run again. */
export async function prepareDatabase(ownerUrl: string): Promise<void> {
  await applyMigrations(ownerUrl);
  await installQueues(ownerUrl);
}
