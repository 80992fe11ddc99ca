import { serve } from '@/app/_kit/serve';
import { reopenLocationEndpoint } from '@/lib/stock/endpoints';

export const POST = serve(reopenLocationEndpoint);
