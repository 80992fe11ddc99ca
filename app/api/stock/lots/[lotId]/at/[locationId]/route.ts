import { serve } from '@/app/_kit/serve';
import { getStockSpotEndpoint } from '@/lib/stock/endpoints';

export const GET = serve(getStockSpotEndpoint);
