import { serve } from '@/app/_kit/serve';
import { setLoadsEndpoint } from '@/lib/batches/endpoints';

export const PUT = serve(setLoadsEndpoint);
