import { serve } from '@/app/_kit/serve';
import { endMySessionsEndpoint } from '@/lib/people/endpoints';

export const POST = serve(endMySessionsEndpoint);
