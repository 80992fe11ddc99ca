import { serve } from '@/app/_kit/serve';
import { setRequirementsEndpoint } from '@/lib/batches/endpoints';
import { addRequirementsEndpoint } from '@/lib/requirements/endpoints';

export const POST = serve(addRequirementsEndpoint);
export const PUT = serve(setRequirementsEndpoint);
