import { endpoint, endpointInSteps } from '@/lib/api/endpoint';

import { completeUpload, inspectUpload } from './complete-upload';
import * as contract from './contract';
import { getFile } from './queries';
import { openFileContent, readFileContent } from './read-file-content';
import { requestUpload } from './request-upload';

export const requestUploadEndpoint = endpoint(contract.requestUpload, requestUpload);
export const completeUploadEndpoint = endpointInSteps(contract.completeUpload, {
  outside: inspectUpload,
  run: completeUpload,
});
export const getFileEndpoint = endpoint(contract.getFile, getFile);
export const readFileContentEndpoint = endpointInSteps(contract.readFileContent, {
  outside: openFileContent,
  run: readFileContent,
});
