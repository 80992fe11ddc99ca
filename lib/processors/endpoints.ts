import { endpoint } from '@/lib/api/endpoint';

import { addProcessor } from './add-processor';
import { addApproval, withdrawApproval } from './approvals';
import * as contract from './contract';
import { inviteProcessor } from './invite-processor';
import { getProcessor, listProcessors } from './queries';
import { updateProcessor } from './update-processor';

export const listProcessorsEndpoint = endpoint(contract.listProcessors, listProcessors);
export const getProcessorEndpoint = endpoint(contract.getProcessor, getProcessor);
export const addProcessorEndpoint = endpoint(contract.addProcessor, addProcessor);
export const updateProcessorEndpoint = endpoint(contract.updateProcessor, updateProcessor);
export const addApprovalEndpoint = endpoint(contract.addApproval, addApproval);
export const withdrawApprovalEndpoint = endpoint(contract.withdrawApproval, withdrawApproval);
export const inviteProcessorEndpoint = endpoint(contract.inviteProcessor, inviteProcessor);
