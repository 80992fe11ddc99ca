import { serve } from '@/app/_kit/serve';
import { getTravellerEndpoint } from '@/lib/batches/endpoints';

export const GET = serve(getTravellerEndpoint);
