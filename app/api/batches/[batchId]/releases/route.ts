import { serve } from '@/app/_kit/serve';
import { listReleasesEndpoint } from '@/lib/stock/endpoints';

export const GET = serve(listReleasesEndpoint);
