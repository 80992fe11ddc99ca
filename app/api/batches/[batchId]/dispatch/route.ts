import { serve } from '@/app/_kit/serve';
import { dispatchBatchEndpoint } from '@/lib/batches/endpoints';

export const POST = serve(dispatchBatchEndpoint);
