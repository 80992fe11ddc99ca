import { serve } from '@/app/_kit/serve';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const GET = serve(getMeEndpoint);
