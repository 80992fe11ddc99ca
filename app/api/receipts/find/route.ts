import { serve } from '@/app/_kit/serve';
import { findForReceivingEndpoint } from '@/lib/receipts/endpoints';

export const GET = serve(findForReceivingEndpoint);
