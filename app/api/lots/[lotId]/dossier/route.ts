import { serve } from '@/app/_kit/serve';
import { getDossierEndpoint, requestDossierEndpoint } from '@/lib/dossiers/endpoints';

export const GET = serve(getDossierEndpoint);
export const POST = serve(requestDossierEndpoint);
