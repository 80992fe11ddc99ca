import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { listMessages } from './list-messages';
import { writeToProcessor } from './write-to-processor';

export const listMessagesEndpoint = endpoint(contract.listMessages, listMessages);
export const writeToProcessorEndpoint = endpoint(contract.writeToProcessor, writeToProcessor);
