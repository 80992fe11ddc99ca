import { serve } from '@/app/_kit/serve';
import { addProcessorEndpoint, listProcessorsEndpoint } from '@/lib/processors/endpoints';

export const GET = serve(listProcessorsEndpoint);
export const POST = serve(addProcessorEndpoint);
