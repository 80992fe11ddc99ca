import { serve } from '@/app/_kit/serve';
import { setPersonActiveEndpoint } from '@/lib/people/endpoints';

export const POST = serve(setPersonActiveEndpoint);
