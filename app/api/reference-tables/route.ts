import { serve } from '@/app/_kit/serve';
import { listReferenceTablesEndpoint } from '@/lib/reference/endpoints';

export const GET = serve(listReferenceTablesEndpoint);
