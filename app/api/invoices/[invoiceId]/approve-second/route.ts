import { serve } from '@/app/_kit/serve';
import { approveInvoiceSecondEndpoint } from '@/lib/invoices/endpoints';

export const POST = serve(approveInvoiceSecondEndpoint);
