import { serve } from '@/app/_kit/serve';
import { listStockEndpoint } from '@/lib/stock/endpoints';

export const GET = serve(listStockEndpoint);
