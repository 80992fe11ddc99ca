import { newPaymentId, seconds } from './call';
import type { Call } from './call';
import { emitEvent } from './emit-event';
import type { Charge, PaymentError, PaymentIntent, Transfer } from './resources';

/** The money has come: charge, transfer to the destination, and the events that say so. */
export function succeedIntent(call: Call, intent: PaymentIntent): void {
  const charge = chargeOf(call, intent);
  charge.status = 'succeeded';
  charge.paid = true;
  charge.captured = true;
  intent.status = 'succeeded';
  intent.amount_received = intent.amount;
  intent.latest_charge = charge.id;
  intent.last_payment_error = null;
  delete call.state.settlements[intent.id];

  const transfer = transferOf(call, intent, charge);
  if (transfer !== null) {
    charge.transfer = transfer.id;
    emitEvent(call, 'transfer.created', transfer);
  }
  emitEvent(call, 'charge.succeeded', charge);
  emitEvent(call, 'payment_intent.succeeded', intent);
}

/** It did not come. The intent waits for another method, as on the wire; it is not dead. */
export function failIntent(call: Call, intent: PaymentIntent, error: PaymentError): void {
  const charge = chargeOf(call, intent);
  charge.status = 'failed';
  charge.failure_code = error.code;
  charge.failure_message = error.message;
  intent.status = 'requires_payment_method';
  intent.latest_charge = charge.id;
  intent.last_payment_error = error;
  intent.payment_method = null;
  delete call.state.settlements[intent.id];
  emitEvent(call, 'charge.failed', charge);
  emitEvent(call, 'payment_intent.payment_failed', intent);
}

export function startProcessing(call: Call, intent: PaymentIntent, outcome: 'succeed' | 'fail'): void {
  const charge = chargeOf(call, intent);
  intent.status = 'processing';
  intent.latest_charge = charge.id;
  intent.last_payment_error = null;
  call.state.settlements[intent.id] = { outcome, atMs: call.nowMs + call.settleAfterMs };
  emitEvent(call, 'charge.pending', charge);
  emitEvent(call, 'payment_intent.processing', intent);
}

/** Ends payments under way: those that are due, or exactly the one asked for. Says how many it ended. */
export function settleDue(
  call: Call,
  asked?: { intent?: string | undefined; outcome?: 'succeed' | 'fail' | undefined },
): string[] {
  const due = Object.entries(call.state.settlements).filter(([id, { atMs }]) =>
    asked === undefined ? atMs <= call.nowMs : asked.intent === undefined || asked.intent === id,
  );
  for (const [id, { outcome }] of due) {
    const intent = call.state.paymentIntents[id];
    if (intent === undefined) continue;
    if ((asked?.outcome ?? outcome) === 'succeed') succeedIntent(call, intent);
    else failIntent(call, intent, LATE_FAILURE);
  }
  return due.map(([id]) => id);
}

const LATE_FAILURE: PaymentError = {
  type: 'invalid_request_error',
  code: 'payment_method_customer_decline',
  message: "The customer's bank account has been closed, so the payment could not be collected.",
};

/** The charge of this attempt: the pending one if there is one, so that a later end does not look like a second charge. */
function chargeOf(call: Call, intent: PaymentIntent): Charge {
  const latest = intent.latest_charge === null ? undefined : call.state.charges[intent.latest_charge];
  if (latest?.status === 'pending') return latest;
  const charge: Charge = {
    id: newPaymentId('ch'),
    object: 'charge',
    created: seconds(call),
    livemode: false,
    amount: intent.amount,
    amount_refunded: 0,
    currency: intent.currency,
    status: 'pending',
    paid: false,
    captured: false,
    refunded: false,
    customer: intent.customer,
    payment_intent: intent.id,
    payment_method: intent.payment_method ?? '',
    failure_code: null,
    failure_message: null,
    transfer: null,
    transfer_data: intent.transfer_data,
    metadata: intent.metadata,
  };
  call.state.charges[charge.id] = charge;
  return charge;
}

function transferOf(call: Call, intent: PaymentIntent, charge: Charge): Transfer | null {
  if (intent.transfer_data === null) return null;
  const transfer: Transfer = {
    id: newPaymentId('tr'),
    object: 'transfer',
    created: seconds(call),
    livemode: false,
    amount: intent.transfer_data.amount ?? intent.amount - (intent.application_fee_amount ?? 0),
    amount_reversed: 0,
    reversed: false,
    currency: intent.currency,
    destination: intent.transfer_data.destination,
    source_transaction: charge.id,
    transfer_group: intent.transfer_group ?? `group_${intent.id}`,
    description: null,
    metadata: {},
  };
  call.state.transfers[transfer.id] = transfer;
  return transfer;
}
