import * as batches from '@/lib/batches/endpoints';
import * as search from '@/lib/search/endpoints';
import * as session from '@/lib/session/endpoints';

import type { Endpoint } from './endpoint';

/** Every read and write there is: what the documentation and the walk over all permissions go by. */
export const ALL_ENDPOINTS: readonly Endpoint[] = [batches, search, session].flatMap((domain) => Object.values(domain) as unknown as Endpoint[]);
