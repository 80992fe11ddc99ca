import { serve } from '@/app/_kit/serve';
import { correctReadingEndpoint } from '@/lib/readings/endpoints';

export const POST = serve(correctReadingEndpoint);
