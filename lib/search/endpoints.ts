import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { listNumbers, searchNumbers } from './search-numbers';

export const searchNumbersEndpoint = endpoint(contract.searchNumbers, searchNumbers);
export const listNumbersEndpoint = endpoint(contract.listNumbers, listNumbers);
