import { serve } from '@/app/_kit/serve';
import { markDoneEndpoint } from '@/lib/portal/endpoints';

export const POST = serve(markDoneEndpoint);
