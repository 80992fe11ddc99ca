import { serve } from '@/app/_kit/serve';
import { readBatchLinkEndpoint } from '@/lib/portal/link-endpoints';

export const GET = serve(readBatchLinkEndpoint);
