import { serve } from '@/app/_kit/serve';
import { closeLocationEndpoint } from '@/lib/stock/endpoints';

export const POST = serve(closeLocationEndpoint);
