import { serve } from '@/app/_kit/serve';
import { listBatchesEndpoint, createBatchEndpoint } from '@/lib/batches/endpoints';

export const GET = serve(listBatchesEndpoint);
export const POST = serve(createBatchEndpoint);
