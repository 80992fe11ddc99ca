import { serve } from '@/app/_kit/serve';
import { setAsideIntakeEndpoint } from '@/lib/readings/endpoints';

export const POST = serve(setAsideIntakeEndpoint);
