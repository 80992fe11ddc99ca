import { serve } from '@/app/_kit/serve';
import { invitePersonEndpoint } from '@/lib/people/endpoints';

export const POST = serve(invitePersonEndpoint);
