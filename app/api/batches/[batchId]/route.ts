import { serve } from '@/app/_kit/serve';
import { getBatchEndpoint, updateBatchEndpoint } from '@/lib/batches/endpoints';

export const GET = serve(getBatchEndpoint);
export const PATCH = serve(updateBatchEndpoint);
