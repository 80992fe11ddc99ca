import { serve } from '@/app/_kit/serve';
import { takeOutPiecesEndpoint } from '@/lib/stock/endpoints';

export const POST = serve(takeOutPiecesEndpoint);
