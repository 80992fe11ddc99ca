import { endpoint } from '@/lib/api/endpoint';

import { addLine } from './add-line';
import { cancelBatch } from './cancel-batch';
import { changeLine } from './change-line';
import * as checking from './check-contract';
import * as contract from './contract';
import { createBatch } from './create-batch';
import { dispatchBatch } from './dispatch-batch';
import { getBatchLines } from './get-batch-lines';
import { getLoadPlan } from './get-load-plan';
import { listStepProcessors, listWaitingLots, listWaitingSteps } from './list-waiting';
import { overrideCheck } from './override-check';
import * as loading from './load-contract';
import * as papers from './paper-contract';
import { putBatchAside } from './put-batch-aside';
import * as queries from './queries';
import { reissueBatch } from './reissue-batch';
import { removeLine } from './remove-line';
import { setLoads } from './set-loads';
import { setRequirements } from './set-requirements';
import { updateBatch } from './update-batch';
import * as waiting from './waiting-contract';
import { withdrawOverride } from './withdraw-override';

export const listBatchesEndpoint = endpoint(contract.listBatches, queries.listBatches);
export const getBatchEndpoint = endpoint(contract.getBatch, queries.getBatch);
export const getBatchLinesEndpoint = endpoint(contract.getBatchLines, getBatchLines);

export const createBatchEndpoint = endpoint(contract.createBatch, createBatch);
export const addLineEndpoint = endpoint(contract.addLine, addLine);
export const changeLineEndpoint = endpoint(contract.changeLine, changeLine);
export const removeLineEndpoint = endpoint(contract.removeLine, removeLine);
export const updateBatchEndpoint = endpoint(contract.updateBatch, updateBatch);
export const setRequirementsEndpoint = endpoint(contract.setRequirements, setRequirements);
export const putBatchAsideEndpoint = endpoint(contract.putBatchAside, putBatchAside);
export const dispatchBatchEndpoint = endpoint(contract.dispatchBatch, dispatchBatch);

export const getLoadPlanEndpoint = endpoint(loading.getLoadPlan, getLoadPlan);
export const setLoadsEndpoint = endpoint(loading.setLoads, setLoads);

export const getBatchChecksEndpoint = endpoint(checking.getBatchChecks, queries.getBatchChecks);
export const overrideCheckEndpoint = endpoint(checking.overrideCheck, overrideCheck);
export const withdrawOverrideEndpoint = endpoint(checking.withdrawOverride, withdrawOverride);

export const listBatchDocumentsEndpoint = endpoint(papers.listBatchDocuments, queries.listBatchDocuments);
export const getTravellerEndpoint = endpoint(papers.getTraveller, queries.getTraveller);
export const reissueBatchEndpoint = endpoint(papers.reissueBatch, reissueBatch);
export const cancelBatchEndpoint = endpoint(papers.cancelBatch, cancelBatch);

export const listWaitingStepsEndpoint = endpoint(waiting.listWaitingSteps, listWaitingSteps);
export const listWaitingLotsEndpoint = endpoint(waiting.listWaitingLots, listWaitingLots);
export const listStepProcessorsEndpoint = endpoint(waiting.listStepProcessors, listStepProcessors);
