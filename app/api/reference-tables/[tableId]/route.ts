import { serve } from '@/app/_kit/serve';
import { getReferenceTableEndpoint } from '@/lib/reference/endpoints';

export const GET = serve(getReferenceTableEndpoint);
