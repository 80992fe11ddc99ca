import { serve } from '@/app/_kit/serve';
import { listNumbersEndpoint } from '@/lib/search/endpoints';

export const GET = serve(listNumbersEndpoint);
