import { serve } from '@/app/_kit/serve';
import { getChartEndpoint } from '@/lib/charts/endpoints';

export const GET = serve(getChartEndpoint);
