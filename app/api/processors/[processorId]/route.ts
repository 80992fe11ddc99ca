import { serve } from '@/app/_kit/serve';
import { getProcessorEndpoint, updateProcessorEndpoint } from '@/lib/processors/endpoints';

export const GET = serve(getProcessorEndpoint);
export const PUT = serve(updateProcessorEndpoint);
