import { serve } from '@/app/_kit/serve';
import { getReceivingEndpoint } from '@/lib/receipts/endpoints';

export const GET = serve(getReceivingEndpoint);
