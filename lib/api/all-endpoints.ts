import * as batches from '@/lib/batches/endpoints';

import type { Endpoint } from './endpoint';

/** Every read and write there is: what the documentation and the walk over all permissions go by. */
export const ALL_ENDPOINTS: readonly Endpoint[] = [batches].flatMap((domain) => Object.values(domain) as unknown as Endpoint[]);
