import { serve } from '@/app/_kit/serve';
import { getTidelineEndpoint } from '@/lib/tideline/endpoints';

export const GET = serve(getTidelineEndpoint);
