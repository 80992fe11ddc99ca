import { serve } from '@/app/_kit/serve';
import { fitPiecesEndpoint } from '@/lib/stock/endpoints';

export const POST = serve(fitPiecesEndpoint);
