import { serve } from '@/app/_kit/serve';
import { getWaitingEndpoint } from '@/lib/tideline/endpoints';

export const GET = serve(getWaitingEndpoint);
