import { serve } from '@/app/_kit/serve';
import { cancelBatchEndpoint } from '@/lib/batches/endpoints';

export const POST = serve(cancelBatchEndpoint);
