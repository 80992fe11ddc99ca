import { serve } from '@/app/_kit/serve';
import { decideRequirementEndpoint } from '@/lib/certificates/endpoints';

export const PUT = serve(decideRequirementEndpoint);
