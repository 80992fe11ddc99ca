import { serve } from '@/app/_kit/serve';
import { listWaitingStepsEndpoint } from '@/lib/batches/endpoints';

export const GET = serve(listWaitingStepsEndpoint);
