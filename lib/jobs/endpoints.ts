import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { listFailedJobs, retryJob } from './failed-jobs';

export const listFailedJobsEndpoint = endpoint(contract.listFailedJobs, listFailedJobs);
export const retryJobEndpoint = endpoint(contract.retryJob, retryJob);
