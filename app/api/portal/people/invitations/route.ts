import { serve } from '@/app/_kit/serve';
import { inviteColleagueEndpoint } from '@/lib/people/endpoints';

export const POST = serve(inviteColleagueEndpoint);
