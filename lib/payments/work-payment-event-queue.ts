import { z } from 'zod';

/** News of the payment service to be worked: an event that came, or a look at a payment of which nothing came. */
export const workPaymentEventQueue = {
  name: 'work-payment-event',
  payload: z.union([
    z.object({ shopId: z.uuid().nullable(), eventId: z.string() }),
    z.object({ shopId: z.uuid(), paymentId: z.uuid(), look: z.int().min(0) }),
  ]),
};
