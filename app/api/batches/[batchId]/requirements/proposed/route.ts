import { serve } from '@/app/_kit/serve';
import { proposeForBatchEndpoint } from '@/lib/requirements/endpoints';

export const GET = serve(proposeForBatchEndpoint);
