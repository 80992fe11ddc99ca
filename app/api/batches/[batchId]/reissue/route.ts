import { serve } from '@/app/_kit/serve';
import { reissueBatchEndpoint } from '@/lib/batches/endpoints';

export const POST = serve(reissueBatchEndpoint);
