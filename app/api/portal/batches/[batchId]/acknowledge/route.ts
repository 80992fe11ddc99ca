import { serve } from '@/app/_kit/serve';
import { acknowledgeBatchEndpoint } from '@/lib/portal/endpoints';

export const POST = serve(acknowledgeBatchEndpoint);
