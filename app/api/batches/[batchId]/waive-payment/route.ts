import { serve } from '@/app/_kit/serve';
import { waivePaymentEndpoint } from '@/lib/invoices/endpoints';

export const POST = serve(waivePaymentEndpoint);
