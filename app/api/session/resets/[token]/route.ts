import { serve } from '@/app/_kit/serve';
import { resetPasswordEndpoint } from '@/lib/people/endpoints';

export const POST = serve(resetPasswordEndpoint);
