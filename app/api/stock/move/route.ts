import { serve } from '@/app/_kit/serve';
import { moveStockEndpoint } from '@/lib/stock/endpoints';

export const POST = serve(moveStockEndpoint);
