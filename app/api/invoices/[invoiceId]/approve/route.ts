import { serve } from '@/app/_kit/serve';
import { approveInvoiceEndpoint } from '@/lib/invoices/endpoints';

export const POST = serve(approveInvoiceEndpoint);
