import { serve } from '@/app/_kit/serve';
import { reportTroubleEndpoint } from '@/lib/portal/endpoints';

export const POST = serve(reportTroubleEndpoint);
