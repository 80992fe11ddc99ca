import { serve } from '@/app/_kit/serve';
import { readMailedLinkEndpoint } from '@/lib/people/endpoints';

export const GET = serve(readMailedLinkEndpoint);
