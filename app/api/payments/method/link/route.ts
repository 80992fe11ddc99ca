import { serve } from '@/app/_kit/serve';
import { linkPayingMethodEndpoint } from '@/lib/payments/endpoints';

export const POST = serve(linkPayingMethodEndpoint);
