import { serve } from '@/app/_kit/serve';
import { setRequirementsEndpoint } from '@/lib/batches/endpoints';

export const PUT = serve(setRequirementsEndpoint);
