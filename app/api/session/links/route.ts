import { serve } from '@/app/_kit/serve';
import { requestSignInLinkEndpoint } from '@/lib/people/endpoints';

export const POST = serve(requestSignInLinkEndpoint);
