import { serve } from '@/app/_kit/serve';
import { releasePiecesEndpoint } from '@/lib/stock/endpoints';

export const POST = serve(releasePiecesEndpoint);
