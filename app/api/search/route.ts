import { serve } from '@/app/_kit/serve';
import { searchNumbersEndpoint } from '@/lib/search/endpoints';

export const GET = serve(searchNumbersEndpoint);
