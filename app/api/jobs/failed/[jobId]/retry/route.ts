import { serve } from '@/app/_kit/serve';
import { retryJobEndpoint } from '@/lib/jobs/endpoints';

export const POST = serve(retryJobEndpoint);
