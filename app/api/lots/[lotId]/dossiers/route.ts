import { serve } from '@/app/_kit/serve';
import { listMadeDossiersEndpoint } from '@/lib/dossiers/endpoints';

export const GET = serve(listMadeDossiersEndpoint);
