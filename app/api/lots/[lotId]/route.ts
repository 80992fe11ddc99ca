import { serve } from '@/app/_kit/serve';
import { editLotEndpoint, getLotEndpoint } from '@/lib/lots/endpoints';

export const GET = serve(getLotEndpoint);
export const PUT = serve(editLotEndpoint);
