import { serve } from '@/app/_kit/serve';
import { editPartEndpoint, getPartEndpoint } from '@/lib/parts/endpoints';

export const GET = serve(getPartEndpoint);
export const PUT = serve(editPartEndpoint);
