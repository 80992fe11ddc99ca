import { serveRaw } from '@/app/_kit/serve-raw';
import { receivePaymentEventEndpoint } from '@/lib/payments/endpoints';

export const POST = serveRaw(receivePaymentEventEndpoint, 'stripe-signature');
