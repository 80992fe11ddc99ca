import { serve } from '@/app/_kit/serve';
import { getPayoutAccountEndpoint } from '@/lib/payments/endpoints';

export const GET = serve(getPayoutAccountEndpoint);
