import { serve } from '@/app/_kit/serve';
import { overrideCheckEndpoint } from '@/lib/batches/endpoints';

export const POST = serve(overrideCheckEndpoint);
