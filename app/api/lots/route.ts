import { serve } from '@/app/_kit/serve';
import { createLotEndpoint, listLotsEndpoint } from '@/lib/lots/endpoints';

export const GET = serve(listLotsEndpoint);
export const POST = serve(createLotEndpoint);
