import { serve } from '@/app/_kit/serve';
import { acceptInvitationEndpoint, readInvitationEndpoint } from '@/lib/people/endpoints';

export const GET = serve(readInvitationEndpoint);
export const POST = serve(acceptInvitationEndpoint);
