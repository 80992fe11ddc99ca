import { serve } from '@/app/_kit/serve';
import { readInvoiceAgainEndpoint } from '@/lib/invoices/endpoints';

export const POST = serve(readInvoiceAgainEndpoint);
