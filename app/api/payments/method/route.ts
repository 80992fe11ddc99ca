import { serve } from '@/app/_kit/serve';
import { getPayingMethodEndpoint } from '@/lib/payments/endpoints';

export const GET = serve(getPayingMethodEndpoint);
