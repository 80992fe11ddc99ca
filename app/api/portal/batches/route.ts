import { serve } from '@/app/_kit/serve';
import { listPortalBatchesEndpoint } from '@/lib/portal/endpoints';

export const GET = serve(listPortalBatchesEndpoint);
