import { serve } from '@/app/_kit/serve';
import { countInEndpoint, listReceiptsEndpoint } from '@/lib/receipts/endpoints';

export const GET = serve(listReceiptsEndpoint);
export const POST = serve(countInEndpoint);
