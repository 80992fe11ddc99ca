import { serve } from '@/app/_kit/serve';
import { readFileContentEndpoint } from '@/lib/files/endpoints';

export const GET = serve(readFileContentEndpoint);
