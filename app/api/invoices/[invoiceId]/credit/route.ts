import { serve } from '@/app/_kit/serve';
import { creditInvoiceEndpoint } from '@/lib/invoices/endpoints';

export const POST = serve(creditInvoiceEndpoint);
