import { serve } from '@/app/_kit/serve';
import { getPortalBatchEndpoint } from '@/lib/portal/endpoints';

export const GET = serve(getPortalBatchEndpoint);
