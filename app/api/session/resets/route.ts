import { serve } from '@/app/_kit/serve';
import { requestResetEndpoint } from '@/lib/people/endpoints';

export const POST = serve(requestResetEndpoint);
