import { serve } from '@/app/_kit/serve';
import { addInvoiceEndpoint, listInvoicesEndpoint } from '@/lib/invoices/endpoints';

export const GET = serve(listInvoicesEndpoint);
export const POST = serve(addInvoiceEndpoint);
