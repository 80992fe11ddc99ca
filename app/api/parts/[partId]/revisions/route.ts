import { serve } from '@/app/_kit/serve';
import { revisePartEndpoint } from '@/lib/parts/endpoints';

export const POST = serve(revisePartEndpoint);
