import { serve } from '@/app/_kit/serve';
import { withdrawBatchLinksEndpoint } from '@/lib/portal/link-endpoints';

export const POST = serve(withdrawBatchLinksEndpoint);
