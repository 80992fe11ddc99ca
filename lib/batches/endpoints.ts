import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import * as queries from './queries';

export const listBatchesEndpoint = endpoint(contract.listBatches, queries.listBatches);
