import { serve } from '@/app/_kit/serve';
import { decideRequirementsEndpoint } from '@/lib/certificates/endpoints';

export const POST = serve(decideRequirementsEndpoint);
