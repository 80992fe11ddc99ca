import { serve } from '@/app/_kit/serve';
import { getInvoiceReadingEndpoint } from '@/lib/invoices/endpoints';

export const GET = serve(getInvoiceReadingEndpoint);
