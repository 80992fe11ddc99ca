import { z } from 'zod';
import { mustReceiveTransfers } from './accounts';
import { listOf, mustFind, newPaymentId, seconds } from './call';
import type { Call } from './call';
import { emitEvent } from './emit-event';
import { expand, flag, metadata, readParams, wholeNumber } from './form';
import { invalid, PaymentFault } from './payment-fault';
import { methodForCustomer } from './payment-methods';
import type { PaymentError, PaymentIntent } from './resources';
import { failIntent, startProcessing, succeedIntent } from './settle-intent';
import type { Behaviour } from './store';
import { behaviourOfAmount } from './test-methods';

const SMALLEST_AMOUNT = 50;
const LARGEST_AMOUNT = 99_999_999;

const CreateParams = z.strictObject({
  amount: wholeNumber,
  currency: z.string().regex(/^[a-zA-Z]{3}$/, 'must be a three-letter currency'),
  customer: z.string().optional(),
  payment_method: z.string().optional(),
  payment_method_types: z.array(z.string()).optional(),
  automatic_payment_methods: z
    .strictObject({ enabled: flag, allow_redirects: z.string().optional() })
    .optional(),
  confirm: flag.optional(),
  off_session: flag.optional(),
  description: z.string().optional(),
  transfer_data: z.strictObject({ destination: z.string(), amount: wholeNumber.optional() }).optional(),
  transfer_group: z.string().optional(),
  application_fee_amount: wholeNumber.optional(),
  on_behalf_of: z.string().optional(),
  return_url: z.string().optional(),
  metadata: metadata.optional(),
  expand: expand.optional(),
});

export function createPaymentIntent(call: Call): PaymentIntent {
  const params = readParams(CreateParams, call.form);
  mustBePayable(params.amount);
  if (params.customer !== undefined) mustFind(call.state.customers, params.customer, 'customer', 'customer');
  if (params.transfer_data !== undefined)
    mustReceiveTransfers(call, params.transfer_data.destination, 'transfer_data[destination]');
  if (params.confirm === true && params.payment_method === undefined) {
    throw invalid('You cannot confirm this PaymentIntent because it is missing a payment method.', {
      code: 'payment_intent_unexpected_state',
    });
  }
  const method =
    params.payment_method === undefined
      ? null
      : ownMethod(call, params.payment_method, params.customer ?? null);

  const id = newPaymentId('pi');
  const intent: PaymentIntent = {
    id,
    object: 'payment_intent',
    created: seconds(call),
    livemode: false,
    amount: params.amount,
    amount_received: 0,
    currency: params.currency.toLowerCase(),
    status: method === null ? 'requires_payment_method' : 'requires_confirmation',
    customer: params.customer ?? null,
    payment_method: method,
    payment_method_types: params.payment_method_types ?? ['card', 'us_bank_account'],
    description: params.description ?? null,
    latest_charge: null,
    last_payment_error: null,
    transfer_data: transferDataOf(params.transfer_data),
    transfer_group: params.transfer_group ?? null,
    application_fee_amount: params.application_fee_amount ?? null,
    canceled_at: null,
    cancellation_reason: null,
    client_secret: `${id}_secret_${newPaymentId('s').slice(3, 15)}`,
    metadata: params.metadata ?? {},
  };
  call.state.paymentIntents[id] = intent;
  emitEvent(call, 'payment_intent.created', intent);
  return params.confirm === true ? confirmed(call, intent) : intent;
}

export function getPaymentIntent(call: Call): PaymentIntent {
  return mustFind(call.state.paymentIntents, call.id, 'payment_intent');
}

export function listPaymentIntents(call: Call) {
  const { customer } = call.form;
  const own = Object.entries(call.state.paymentIntents).filter(
    ([, intent]) => customer === undefined || intent.customer === customer,
  );
  return listOf(Object.fromEntries(own), call.form, '/v1/payment_intents');
}

const ConfirmParams = z.strictObject({
  payment_method: z.string().optional(),
  off_session: flag.optional(),
  return_url: z.string().optional(),
  expand: expand.optional(),
});

export function confirmPaymentIntent(call: Call): PaymentIntent {
  const params = readParams(ConfirmParams, call.form);
  const intent = getPaymentIntent(call);
  if (intent.status !== 'requires_confirmation' && intent.status !== 'requires_payment_method') {
    throw wrongState(intent, 'confirm');
  }
  if (params.payment_method !== undefined)
    intent.payment_method = ownMethod(call, params.payment_method, intent.customer);
  if (intent.payment_method === null) {
    throw invalid('You cannot confirm this PaymentIntent because it is missing a payment method.', {
      code: 'payment_intent_unexpected_state',
    });
  }
  return confirmed(call, intent);
}

export function cancelPaymentIntent(call: Call): PaymentIntent {
  const { cancellation_reason: reason } = readParams(
    z.strictObject({ cancellation_reason: z.string().optional(), expand: expand.optional() }),
    call.form,
  );
  const intent = getPaymentIntent(call);
  if (intent.status !== 'requires_confirmation' && intent.status !== 'requires_payment_method') {
    throw wrongState(intent, 'cancel');
  }
  intent.status = 'canceled';
  intent.canceled_at = seconds(call);
  intent.cancellation_reason = reason ?? null;
  emitEvent(call, 'payment_intent.canceled', intent);
  return intent;
}

function confirmed(call: Call, intent: PaymentIntent): PaymentIntent {
  const behaviour = behaviourOfAmount(intent.amount) ?? behaviourOfMethod(call, intent);
  switch (behaviour.outcome) {
    case 'succeed':
      succeedIntent(call, intent);
      return intent;
    case 'succeed_later':
      startProcessing(call, intent, 'succeed');
      return intent;
    case 'fail_later':
      startProcessing(call, intent, 'fail');
      return intent;
    case 'decline': {
      const error = declineOf(behaviour);
      failIntent(call, intent, error);
      throw new PaymentFault(402, { ...error, payment_intent: structuredClone(intent) });
    }
  }
}

function behaviourOfMethod(call: Call, intent: PaymentIntent): Behaviour {
  return call.state.behaviours[intent.payment_method ?? ''] ?? { outcome: 'succeed' };
}

function declineOf({ code = 'card_declined', declineCode = 'generic_decline' }: Behaviour): PaymentError {
  const words: Readonly<Record<string, string>> = {
    insufficient_funds: 'Your card has insufficient funds.',
    expired_card: 'Your card has expired.',
    authentication_required: 'Your card was declined. This transaction requires authentication.',
  };
  return {
    type: 'card_error',
    code,
    decline_code: declineCode,
    message: words[declineCode] ?? 'Your card was declined.',
  };
}

/** A method saved by somebody else must never pay: the real service refuses it, so ours does. */
function ownMethod(call: Call, methodId: string, customerId: string | null): string {
  if (customerId !== null && methodId.startsWith('pm_card_'))
    return methodForCustomer(call, methodId, customerId).id;
  if (customerId !== null && methodId.startsWith('pm_usBankAccount_'))
    return methodForCustomer(call, methodId, customerId).id;
  const method = mustFind(call.state.paymentMethods, methodId, 'PaymentMethod', 'payment_method');
  if (method.customer !== customerId) {
    throw invalid('The PaymentMethod does not belong to the Customer of this PaymentIntent.', {
      code: 'resource_missing',
      param: 'payment_method',
    });
  }
  return method.id;
}

function transferDataOf(
  given: { destination: string; amount?: number | undefined } | undefined,
): PaymentIntent['transfer_data'] {
  if (given === undefined) return null;
  return { destination: given.destination, ...(given.amount === undefined ? {} : { amount: given.amount }) };
}

function mustBePayable(amount: number): void {
  if (amount < SMALLEST_AMOUNT)
    throw invalid('Amount must be at least 50 cents.', { code: 'amount_too_small', param: 'amount' });
  if (amount > LARGEST_AMOUNT)
    throw invalid('Amount must be no more than 999,999.99.', { code: 'amount_too_large', param: 'amount' });
}

function wrongState(intent: PaymentIntent, verb: string): PaymentFault {
  return new PaymentFault(400, {
    type: 'invalid_request_error',
    code: 'payment_intent_unexpected_state',
    message: `You cannot ${verb} this PaymentIntent because it has a status of ${intent.status}.`,
    payment_intent: structuredClone(intent),
  });
}
