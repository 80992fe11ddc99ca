import { serve } from '@/app/_kit/serve';
import { withdrawOwnTableEndpoint } from '@/lib/reference/endpoints';

export const POST = serve(withdrawOwnTableEndpoint);
