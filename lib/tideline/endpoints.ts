import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { getTideline } from './get-tideline';

export const getTidelineEndpoint = endpoint(contract.getTideline, getTideline);
