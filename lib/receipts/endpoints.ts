import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { countIn } from './count-in';
import * as queries from './queries';

export const findForReceivingEndpoint = endpoint(contract.findForReceiving, queries.findForReceiving);
export const getReceivingEndpoint = endpoint(contract.getReceiving, queries.getReceiving);
export const countInEndpoint = endpoint(contract.countIn, countIn);
export const listReceiptsEndpoint = endpoint(contract.listReceipts, queries.listReceipts);
