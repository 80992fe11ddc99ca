import { serve } from '@/app/_kit/serve';
import { listWaitingLotsEndpoint } from '@/lib/batches/endpoints';

export const GET = serve(listWaitingLotsEndpoint);
