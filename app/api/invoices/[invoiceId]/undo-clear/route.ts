import { serve } from '@/app/_kit/serve';
import { undoClearanceEndpoint } from '@/lib/invoices/endpoints';

export const POST = serve(undoClearanceEndpoint);
