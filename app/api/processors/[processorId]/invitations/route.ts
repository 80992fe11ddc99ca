import { serve } from '@/app/_kit/serve';
import { inviteProcessorEndpoint } from '@/lib/processors/endpoints';

export const POST = serve(inviteProcessorEndpoint);
