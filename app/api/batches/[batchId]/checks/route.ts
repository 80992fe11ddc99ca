import { serve } from '@/app/_kit/serve';
import { getBatchChecksEndpoint } from '@/lib/batches/endpoints';

export const GET = serve(getBatchChecksEndpoint);
