import { serve } from '@/app/_kit/serve';
import { addApprovalEndpoint } from '@/lib/processors/endpoints';

export const POST = serve(addApprovalEndpoint);
