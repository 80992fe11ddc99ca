import { serve } from '@/app/_kit/serve';
import { importLotsEndpoint } from '@/lib/lots/endpoints';

export const POST = serve(importLotsEndpoint);
