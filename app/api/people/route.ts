import { serve } from '@/app/_kit/serve';
import { listPeopleEndpoint } from '@/lib/people/endpoints';

export const GET = serve(listPeopleEndpoint);
