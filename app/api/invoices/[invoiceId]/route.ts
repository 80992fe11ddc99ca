import { serve } from '@/app/_kit/serve';
import { enterInvoiceEndpoint, getInvoiceEndpoint } from '@/lib/invoices/endpoints';

export const GET = serve(getInvoiceEndpoint);
export const PUT = serve(enterInvoiceEndpoint);
