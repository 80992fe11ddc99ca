import { serve } from '@/app/_kit/serve';
import { judgeChartEndpoint } from '@/lib/charts/endpoints';

export const POST = serve(judgeChartEndpoint);
