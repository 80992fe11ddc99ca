import { serve } from '@/app/_kit/serve';
import { promiseDayEndpoint } from '@/lib/portal/endpoints';

export const POST = serve(promiseDayEndpoint);
