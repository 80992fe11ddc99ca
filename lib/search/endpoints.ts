import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { searchNumbers } from './search-numbers';

export const searchNumbersEndpoint = endpoint(contract.searchNumbers, searchNumbers);
