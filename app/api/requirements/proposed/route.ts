import { serve } from '@/app/_kit/serve';
import { proposeForStepEndpoint } from '@/lib/requirements/endpoints';

export const GET = serve(proposeForStepEndpoint);
