import { serve } from '@/app/_kit/serve';
import { checkOwnTableEndpoint } from '@/lib/reference/endpoints';

export const POST = serve(checkOwnTableEndpoint);
