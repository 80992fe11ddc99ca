import { serve } from '@/app/_kit/serve';
import { listBatchLinksEndpoint, sendBatchLinkEndpoint } from '@/lib/portal/link-endpoints';

export const GET = serve(listBatchLinksEndpoint);
export const POST = serve(sendBatchLinkEndpoint);
