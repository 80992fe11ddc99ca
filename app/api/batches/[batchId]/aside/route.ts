import { serve } from '@/app/_kit/serve';
import { putBatchAsideEndpoint } from '@/lib/batches/endpoints';

export const POST = serve(putBatchAsideEndpoint);
