import { serve } from '@/app/_kit/serve';
import { getAccountEndpoint, updateAccountEndpoint } from '@/lib/people/endpoints';

export const GET = serve(getAccountEndpoint);
export const PATCH = serve(updateAccountEndpoint);
