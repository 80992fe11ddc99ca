import { serve } from '@/app/_kit/serve';
import { linkPayoutAccountEndpoint } from '@/lib/payments/endpoints';

export const POST = serve(linkPayoutAccountEndpoint);
