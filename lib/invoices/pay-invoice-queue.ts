import { z } from 'zod';

/**
 * One attempt to pay, to be handed to the payment service by the worker. Carries all the request is made of, so that
 * every try of the job is the same request, whatever is changed in the settings meanwhile.
 */
export const payInvoiceQueue = {
  name: 'pay-invoice',
  payload: z.object({
    shopId: z.uuid(),
    paymentId: z.uuid(),
    customer: z.string(),
    paymentMethod: z.string(),
    destinationAccount: z.string(),
  }),
};
