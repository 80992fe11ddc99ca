import { serve } from '@/app/_kit/serve';
import { assignIntakeEndpoint } from '@/lib/readings/endpoints';

export const POST = serve(assignIntakeEndpoint);
