import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import * as queries from './queries';

export const listAuditEndpoint = endpoint(contract.listAudit, queries.listAudit);
export const listAuditFiltersEndpoint = endpoint(contract.listAuditFilters, queries.listAuditFilters);
