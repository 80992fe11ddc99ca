import { z } from 'zod';
import { listOf, mustFind, newPaymentId, seconds } from './call';
import type { Call } from './call';
import { emitEvent } from './emit-event';
import { expand, flag, metadata, readParams, wholeNumber } from './form';
import { invalid } from './payment-fault';
import type { Charge, Refund } from './resources';

const CreateParams = z.strictObject({
  payment_intent: z.string().optional(),
  charge: z.string().optional(),
  amount: wholeNumber.optional(),
  reason: z.enum(['duplicate', 'fraudulent', 'requested_by_customer']).optional(),
  reverse_transfer: flag.optional(),
  refund_application_fee: flag.optional(),
  metadata: metadata.optional(),
  expand: expand.optional(),
});

export function createRefund(call: Call): Refund {
  const params = readParams(CreateParams, call.form);
  const charge = chargeToRefund(call, params);
  const left = charge.amount - charge.amount_refunded;
  if (left === 0)
    throw invalid(`Charge ${charge.id} has already been refunded.`, { code: 'charge_already_refunded' });
  const amount = params.amount ?? left;
  if (amount < 1)
    throw invalid('Invalid positive integer', { code: 'parameter_invalid_integer', param: 'amount' });
  if (amount > left)
    throw invalid(`Refund amount (${amount}) is greater than unrefunded amount on charge (${left})`, {
      param: 'amount',
    });

  charge.amount_refunded += amount;
  charge.refunded = charge.amount_refunded === charge.amount;
  const refund: Refund = {
    id: newPaymentId('re'),
    object: 'refund',
    created: seconds(call),
    livemode: false,
    amount,
    currency: charge.currency,
    status: 'succeeded',
    charge: charge.id,
    payment_intent: charge.payment_intent,
    reason: params.reason ?? null,
    transfer_reversal: params.reverse_transfer === true ? reverseTransfer(call, charge, amount) : null,
    metadata: params.metadata ?? {},
  };
  call.state.refunds[refund.id] = refund;
  emitEvent(call, 'refund.created', refund);
  emitEvent(call, 'charge.refunded', charge);
  return refund;
}

export function getRefund(call: Call): Refund {
  return mustFind(call.state.refunds, call.id, 'refund');
}

export function listRefunds(call: Call) {
  const { payment_intent: intent } = call.form;
  const own = Object.entries(call.state.refunds).filter(
    ([, refund]) => intent === undefined || refund.payment_intent === intent,
  );
  return listOf(Object.fromEntries(own), call.form, '/v1/refunds');
}

function chargeToRefund(
  call: Call,
  {
    payment_intent: intentId,
    charge: chargeId,
  }: { payment_intent?: string | undefined; charge?: string | undefined },
): Charge {
  if (intentId === undefined) return mustFind(call.state.charges, chargeId ?? '', 'charge', 'charge');
  const intent = mustFind(call.state.paymentIntents, intentId, 'payment_intent', 'payment_intent');
  const charge = call.state.charges[intent.latest_charge ?? ''];
  if (charge === undefined || charge.status !== 'succeeded') {
    throw invalid(`This PaymentIntent (${intent.id}) does not have a successful charge to refund.`, {
      param: 'payment_intent',
    });
  }
  return charge;
}

function reverseTransfer(call: Call, charge: Charge, amount: number): string | null {
  const transfer = call.state.transfers[charge.transfer ?? ''];
  if (transfer === undefined)
    throw invalid('The charge has no transfer to reverse.', { param: 'reverse_transfer' });
  transfer.amount_reversed = Math.min(transfer.amount, transfer.amount_reversed + amount);
  transfer.reversed = transfer.amount_reversed === transfer.amount;
  emitEvent(call, 'transfer.reversed', transfer);
  return newPaymentId('trr');
}
