import { serve } from '@/app/_kit/serve';
import { addFromFileEndpoint } from '@/lib/readings/endpoints';

export const POST = serve(addFromFileEndpoint);
