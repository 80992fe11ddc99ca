import { serve } from '@/app/_kit/serve';
import { listMovementsEndpoint } from '@/lib/lots/endpoints';

export const GET = serve(listMovementsEndpoint);
