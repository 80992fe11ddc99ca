import type { Ctx } from '@/lib/auth/context';

import { BATCH_TABLES, type BatchTables } from './batch-tables';

/** The tables that answers for a shop are read from: the published ones. */
export const tablesOf = (_ctx: Ctx): BatchTables => BATCH_TABLES;
