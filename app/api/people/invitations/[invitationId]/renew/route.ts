import { serve } from '@/app/_kit/serve';
import { renewInvitationEndpoint } from '@/lib/people/endpoints';

export const POST = serve(renewInvitationEndpoint);
