import { serve } from '@/app/_kit/serve';
import { getFileEndpoint } from '@/lib/files/endpoints';

export const GET = serve(getFileEndpoint);
