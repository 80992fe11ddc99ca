import { serve } from '@/app/_kit/serve';
import { revokeTokenEndpoint } from '@/lib/people/endpoints';

export const POST = serve(revokeTokenEndpoint);
