import { endpoint } from '@/lib/api/endpoint';

import { addRequirements } from './add-requirements';
import * as contract from './contract';
import { proposeForBatch } from './propose-for-batch';
import { proposeForStep } from './propose-for-step';

export const proposeForStepEndpoint = endpoint(contract.proposeForStep, proposeForStep);
export const proposeForBatchEndpoint = endpoint(contract.proposeForBatch, proposeForBatch);
export const addRequirementsEndpoint = endpoint(contract.addRequirements, addRequirements);
