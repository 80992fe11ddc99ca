import { serve } from '@/app/_kit/serve';
import { getLoadPlanEndpoint } from '@/lib/batches/endpoints';

export const GET = serve(getLoadPlanEndpoint);
