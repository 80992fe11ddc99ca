import { serve } from '@/app/_kit/serve';
import { withdrawOverrideEndpoint } from '@/lib/batches/endpoints';

export const DELETE = serve(withdrawOverrideEndpoint);
