import { serve } from '@/app/_kit/serve';
import { getRaisableEndpoint } from '@/lib/nonconformances/endpoints';

export const GET = serve(getRaisableEndpoint);
