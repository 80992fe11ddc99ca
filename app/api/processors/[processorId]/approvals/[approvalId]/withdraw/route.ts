import { serve } from '@/app/_kit/serve';
import { withdrawApprovalEndpoint } from '@/lib/processors/endpoints';

export const POST = serve(withdrawApprovalEndpoint);
