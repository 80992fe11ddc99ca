import { serve } from '@/app/_kit/serve';
import { enterOwnTableEndpoint } from '@/lib/reference/endpoints';

export const POST = serve(enterOwnTableEndpoint);
