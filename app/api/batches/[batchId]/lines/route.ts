import { serve } from '@/app/_kit/serve';
import { getBatchLinesEndpoint, addLineEndpoint } from '@/lib/batches/endpoints';

export const GET = serve(getBatchLinesEndpoint);
export const POST = serve(addLineEndpoint);
