import { endpoint } from '@/lib/api/endpoint';

import * as contract from './link-contract';
import { listBatchLinks } from './list-batch-links';
import { readBatchLink } from './read-batch-link';
import { sendBatchLink } from './send-batch-link';
import { withdrawBatchLinks } from './withdraw-batch-links';

export const readBatchLinkEndpoint = endpoint(contract.readBatchLink, readBatchLink);
export const listBatchLinksEndpoint = endpoint(contract.listBatchLinks, listBatchLinks);
export const sendBatchLinkEndpoint = endpoint(contract.sendBatchLink, sendBatchLink);
export const withdrawBatchLinksEndpoint = endpoint(contract.withdrawBatchLinks, withdrawBatchLinks);
