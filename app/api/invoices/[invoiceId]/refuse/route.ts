import { serve } from '@/app/_kit/serve';
import { refuseInvoiceEndpoint } from '@/lib/invoices/endpoints';

export const POST = serve(refuseInvoiceEndpoint);
