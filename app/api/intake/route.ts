import { serve } from '@/app/_kit/serve';
import { listIntakeEndpoint, addToIntakeEndpoint } from '@/lib/readings/endpoints';

export const GET = serve(listIntakeEndpoint);
export const POST = serve(addToIntakeEndpoint);
