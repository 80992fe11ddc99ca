import { serve } from '@/app/_kit/serve';
import { listColleaguesEndpoint } from '@/lib/people/endpoints';

export const GET = serve(listColleaguesEndpoint);
