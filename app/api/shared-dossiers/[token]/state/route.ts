import { serve } from '@/app/_kit/serve';
import { readDossierLinkEndpoint } from '@/lib/dossiers/endpoints';

export const GET = serve(readDossierLinkEndpoint);
