import { serve } from '@/app/_kit/serve';
import { payInvoiceEndpoint } from '@/lib/invoices/endpoints';

export const POST = serve(payInvoiceEndpoint);
