import { serve } from '@/app/_kit/serve';
import { openDossierLinkEndpoint } from '@/lib/dossiers/endpoints';

export const GET = serve(openDossierLinkEndpoint);
