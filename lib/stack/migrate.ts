import { env } from '@/lib/env';
import { prepareDatabase } from './prepare-database';

await prepareDatabase(env.DATABASE_OWNER_URL);
console.log('The database is up to date.');
