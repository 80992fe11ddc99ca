import { serve } from '@/app/_kit/serve';
import { getGateEndpoint } from '@/lib/stock/endpoints';

export const GET = serve(getGateEndpoint);
