import { serve } from '@/app/_kit/serve';
import { changePasswordEndpoint } from '@/lib/people/endpoints';

export const POST = serve(changePasswordEndpoint);
