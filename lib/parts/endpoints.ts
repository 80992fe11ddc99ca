import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { createPart } from './create-part';
import { editPart } from './edit-part';
import * as queries from './queries';
import { revisePart } from './revise-part';

export const listPartsEndpoint = endpoint(contract.listParts, queries.listParts);
export const getPartEndpoint = endpoint(contract.getPart, queries.getPart);
export const createPartEndpoint = endpoint(contract.createPart, createPart);
export const editPartEndpoint = endpoint(contract.editPart, editPart);
export const revisePartEndpoint = endpoint(contract.revisePart, revisePart);
