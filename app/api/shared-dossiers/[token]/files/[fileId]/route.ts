import { serve } from '@/app/_kit/serve';
import { readSharedFileEndpoint } from '@/lib/dossiers/endpoints';

export const GET = serve(readSharedFileEndpoint);
