import { serve } from '@/app/_kit/serve';
import { setColleagueActiveEndpoint } from '@/lib/people/endpoints';

export const POST = serve(setColleagueActiveEndpoint);
