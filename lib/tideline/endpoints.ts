import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { getTideline } from './get-tideline';
import { getWaiting } from './get-waiting';

export const getTidelineEndpoint = endpoint(contract.getTideline, getTideline);
export const getWaitingEndpoint = endpoint(contract.getWaiting, getWaiting);
