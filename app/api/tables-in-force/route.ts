import { serve } from '@/app/_kit/serve';
import { getTablesInForceEndpoint } from '@/lib/reference/endpoints';

export const GET = serve(getTablesInForceEndpoint);
