import { endpoint } from '@/lib/api/endpoint';

import { acknowledgeBatch } from './acknowledge-batch';
import * as contract from './contract';
import { getPortalBatch } from './get-portal-batch';
import { listPortalBatches } from './list-portal-batches';
import { markDone } from './mark-done';
import { promiseDay } from './promise-day';
import { sendPaper } from './send-paper';
import { shipBatch } from './ship-batch';
import { listPortalMessages, reportTrouble, writeToShop } from './write-to-shop';

export const listPortalBatchesEndpoint = endpoint(contract.listPortalBatches, listPortalBatches);
export const getPortalBatchEndpoint = endpoint(contract.getPortalBatch, getPortalBatch);
export const acknowledgeBatchEndpoint = endpoint(contract.acknowledgeBatch, acknowledgeBatch);
export const promiseDayEndpoint = endpoint(contract.promiseDay, promiseDay);
export const markDoneEndpoint = endpoint(contract.markDone, markDone);
export const shipBatchEndpoint = endpoint(contract.shipBatch, shipBatch);
export const reportTroubleEndpoint = endpoint(contract.reportTrouble, reportTrouble);
export const listPortalMessagesEndpoint = endpoint(contract.listPortalMessages, listPortalMessages);
export const writeToShopEndpoint = endpoint(contract.writeToShop, writeToShop);
export const sendPaperEndpoint = endpoint(contract.sendPaper, sendPaper);
