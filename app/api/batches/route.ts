import { serve } from '@/app/_kit/serve';
import { listBatchesEndpoint } from '@/lib/batches/endpoints';

export const GET = serve(listBatchesEndpoint);
