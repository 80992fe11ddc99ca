import { serve } from '@/app/_kit/serve';
import { shareDossierEndpoint } from '@/lib/dossiers/endpoints';

export const POST = serve(shareDossierEndpoint);
