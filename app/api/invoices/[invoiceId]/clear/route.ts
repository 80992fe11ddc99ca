import { serve } from '@/app/_kit/serve';
import { clearDifferenceEndpoint } from '@/lib/invoices/endpoints';

export const POST = serve(clearDifferenceEndpoint);
