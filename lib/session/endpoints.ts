import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { getMe } from './get-me';

export const getMeEndpoint = endpoint(contract.getMe, getMe);
