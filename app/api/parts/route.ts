import { serve } from '@/app/_kit/serve';
import { createPartEndpoint, listPartsEndpoint } from '@/lib/parts/endpoints';

export const GET = serve(listPartsEndpoint);
export const POST = serve(createPartEndpoint);
