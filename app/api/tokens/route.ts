import { serve } from '@/app/_kit/serve';
import { createTokenEndpoint, listTokensEndpoint } from '@/lib/people/endpoints';

export const GET = serve(listTokensEndpoint);
export const POST = serve(createTokenEndpoint);
