import { serve } from '@/app/_kit/serve';
import { changeRolesEndpoint } from '@/lib/people/endpoints';

export const POST = serve(changeRolesEndpoint);
