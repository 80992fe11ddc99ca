import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { disposeNonconformance } from './dispose-nonconformance';
import * as queries from './queries';
import { raiseNonconformance } from './raise-nonconformance';

export const listNonconformancesEndpoint = endpoint(
  contract.listNonconformances,
  queries.listNonconformances,
);
export const getNonconformanceEndpoint = endpoint(contract.getNonconformance, queries.getNonconformance);
export const getRaisableEndpoint = endpoint(contract.getRaisable, queries.getRaisable);
export const raiseNonconformanceEndpoint = endpoint(contract.raiseNonconformance, raiseNonconformance);
export const disposeNonconformanceEndpoint = endpoint(contract.disposeNonconformance, disposeNonconformance);
