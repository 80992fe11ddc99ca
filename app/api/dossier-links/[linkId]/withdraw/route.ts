import { serve } from '@/app/_kit/serve';
import { withdrawDossierLinkEndpoint } from '@/lib/dossiers/endpoints';

export const POST = serve(withdrawDossierLinkEndpoint);
