import { workPaymentEvent } from '@/lib/payments/work-payment-event';
import { workPaymentEventQueue } from '@/lib/payments/work-payment-event-queue';

import { job } from '../job';

export const workPaymentEventJob = job({
  ...workPaymentEventQueue,
  retries: 10,
  retryDelayS: 2,
  run: workPaymentEvent,
});
