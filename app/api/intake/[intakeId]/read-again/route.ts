import { serve } from '@/app/_kit/serve';
import { readIntakeAgainEndpoint } from '@/lib/readings/endpoints';

export const POST = serve(readIntakeAgainEndpoint);
