import { serve } from '@/app/_kit/serve';
import { listStepProcessorsEndpoint } from '@/lib/batches/endpoints';

export const GET = serve(listStepProcessorsEndpoint);
