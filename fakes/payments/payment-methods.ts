import { z } from 'zod';
import { listOf, mustFind, newPaymentId, seconds } from './call';
import type { Call } from './call';
import { emitEvent } from './emit-event';
import { expand, metadata, readParams } from './form';
import { invalid } from './payment-fault';
import type { PaymentMethod } from './resources';
import { TEST_METHODS, testMethodOfNumber } from './test-methods';

const CreateParams = z.strictObject({
  type: z.enum(['card', 'us_bank_account']),
  card: z.object({ number: z.string().optional(), token: z.string().optional() }).optional(),
  us_bank_account: z.object({ account_number: z.string() }).optional(),
  billing_details: z.object({ name: z.string().optional(), email: z.string().optional() }).optional(),
  metadata: metadata.optional(),
  expand: expand.optional(),
});

export function createPaymentMethod(call: Call): PaymentMethod {
  const params = readParams(CreateParams, call.form);
  const number = params.card?.number ?? params.us_bank_account?.account_number;
  const known = number === undefined ? knownToken(params.card?.token) : testMethodOfNumber(number);
  if (known === null)
    throw invalid('Your number is not one of the test numbers.', {
      code: 'incorrect_number',
      param: params.type,
    });
  const method = makeMethod(call, known, null);
  method.billing_details = {
    name: params.billing_details?.name ?? null,
    email: params.billing_details?.email ?? null,
  };
  method.metadata = params.metadata ?? {};
  return method;
}

export function getPaymentMethod(call: Call): PaymentMethod {
  return mustFind(call.state.paymentMethods, call.id, 'PaymentMethod');
}

export function attachPaymentMethod(call: Call): PaymentMethod {
  const { customer } = readParams(
    z.strictObject({ customer: z.string(), expand: expand.optional() }),
    call.form,
  );
  return methodForCustomer(call, call.id, customer);
}

export function detachPaymentMethod(call: Call): PaymentMethod {
  const method = getPaymentMethod(call);
  if (method.customer === null)
    throw invalid('The payment method is not attached to a customer.', {
      code: 'payment_method_unexpected_state',
    });
  const owner = call.state.customers[method.customer];
  if (owner?.invoice_settings.default_payment_method === method.id)
    owner.invoice_settings.default_payment_method = null;
  method.customer = null;
  emitEvent(call, 'payment_method.detached', method);
  return method;
}

/** Both `/v1/payment_methods?customer=` and `/v1/customers/:id/payment_methods`. */
export function listPaymentMethods(call: Call) {
  const asked = call.form['customer'];
  const customer = call.id || (typeof asked === 'string' ? asked : '');
  const { type } = call.form;
  const own = Object.entries(call.state.paymentMethods).filter(
    ([, method]) => method.customer === customer && (type === undefined || method.type === type),
  );
  return listOf(Object.fromEntries(own), call.form, '/v1/payment_methods');
}

/** The saved method for a customer. A well-known test method is copied; one that belongs to somebody else is refused. */
export function methodForCustomer(call: Call, methodId: string, customerId: string): PaymentMethod {
  mustFind(call.state.customers, customerId, 'customer', 'customer');
  const method =
    methodId in TEST_METHODS
      ? makeMethod(call, methodId, null)
      : mustFind(call.state.paymentMethods, methodId, 'PaymentMethod', 'payment_method');
  if (method.customer === customerId) return method;
  if (method.customer !== null) {
    throw invalid('The payment method you provided has already been attached to a customer.', {
      code: 'payment_method_unexpected_state',
      param: 'payment_method',
    });
  }
  method.customer = customerId;
  emitEvent(call, 'payment_method.attached', method);
  return method;
}

function makeMethod(call: Call, testMethodId: string, customer: string | null): PaymentMethod {
  const template = mustFind({ ...TEST_METHODS }, testMethodId, 'PaymentMethod', 'payment_method');
  const method: PaymentMethod = {
    id: newPaymentId('pm'),
    object: 'payment_method',
    created: seconds(call),
    livemode: false,
    customer,
    billing_details: { name: null, email: null },
    metadata: {},
    ...structuredClone(template.method),
  };
  call.state.paymentMethods[method.id] = method;
  call.state.behaviours[method.id] = template.behaviour;
  return method;
}

function knownToken(token: string | undefined): string | null {
  const id = token?.replace(/^tok_/, 'pm_card_');
  return id !== undefined && id in TEST_METHODS ? id : null;
}
