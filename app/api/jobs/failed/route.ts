import { serve } from '@/app/_kit/serve';
import { listFailedJobsEndpoint } from '@/lib/jobs/endpoints';

export const GET = serve(listFailedJobsEndpoint);
