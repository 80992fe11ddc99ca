import { serve } from '@/app/_kit/serve';
import { sendPaperEndpoint } from '@/lib/portal/endpoints';

export const POST = serve(sendPaperEndpoint);
