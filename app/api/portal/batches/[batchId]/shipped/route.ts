import { serve } from '@/app/_kit/serve';
import { shipBatchEndpoint } from '@/lib/portal/endpoints';

export const POST = serve(shipBatchEndpoint);
