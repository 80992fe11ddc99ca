import { serve } from '@/app/_kit/serve';
import { withdrawInvitationEndpoint } from '@/lib/people/endpoints';

export const POST = serve(withdrawInvitationEndpoint);
