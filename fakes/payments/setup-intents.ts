import { z } from 'zod';
import { listOf, mustFind, newPaymentId, seconds } from './call';
import type { Call } from './call';
import { emitEvent } from './emit-event';
import { expand, flag, metadata, readParams } from './form';
import { invalid } from './payment-fault';
import { methodForCustomer } from './payment-methods';
import type { CheckoutSession, SetupIntent } from './resources';

const SESSION_LIFE_S = 24 * 60 * 60;

const SetupParams = z.strictObject({
  customer: z.string().optional(),
  payment_method: z.string().optional(),
  payment_method_types: z.array(z.string()).optional(),
  automatic_payment_methods: z
    .strictObject({ enabled: flag, allow_redirects: z.string().optional() })
    .optional(),
  usage: z.string().optional(),
  confirm: flag.optional(),
  metadata: metadata.optional(),
  expand: expand.optional(),
});

export function createSetupIntent(call: Call): SetupIntent {
  const params = readParams(SetupParams, call.form);
  if (params.customer !== undefined) mustFind(call.state.customers, params.customer, 'customer', 'customer');
  const intent = makeSetupIntent(call, params.customer ?? null, params.metadata ?? {});
  if (params.payment_method !== undefined) {
    intent.payment_method = params.payment_method;
    intent.status = 'requires_confirmation';
  }
  return params.confirm === true ? succeedSetup(call, intent, params.payment_method) : intent;
}

export function getSetupIntent(call: Call): SetupIntent {
  return mustFind(call.state.setupIntents, call.id, 'setupintent');
}

export function confirmSetupIntent(call: Call): SetupIntent {
  const params = readParams(
    z.strictObject({
      payment_method: z.string().optional(),
      return_url: z.string().optional(),
      expand: expand.optional(),
    }),
    call.form,
  );
  return succeedSetup(call, getSetupIntent(call), params.payment_method);
}

const SessionParams = z.strictObject({
  mode: z.literal('setup'),
  customer: z.string(),
  currency: z.string().optional(),
  payment_method_types: z.array(z.string()).optional(),
  client_reference_id: z.string().optional(),
  success_url: z.string(),
  cancel_url: z.string().optional(),
  metadata: metadata.optional(),
  expand: expand.optional(),
});

/** A page of ours on which the office saves a method, so that its number never passes through the product. */
export function createCheckoutSession(call: Call): CheckoutSession {
  const params = readParams(SessionParams, call.form);
  mustFind(call.state.customers, params.customer, 'customer', 'customer');
  const id = newPaymentId('cs_test');
  const session: CheckoutSession = {
    id,
    object: 'checkout.session',
    created: seconds(call),
    livemode: false,
    mode: 'setup',
    status: 'open',
    customer: params.customer,
    client_reference_id: params.client_reference_id ?? null,
    setup_intent: makeSetupIntent(call, params.customer, params.metadata ?? {}).id,
    success_url: params.success_url,
    cancel_url: params.cancel_url ?? null,
    expires_at: seconds(call) + SESSION_LIFE_S,
    url: `${call.address}/checkout/${id}`,
    metadata: params.metadata ?? {},
  };
  call.state.sessions[id] = session;
  return session;
}

export function getCheckoutSession(call: Call): CheckoutSession {
  return mustFind(call.state.sessions, call.id, 'checkout session');
}

export function listCheckoutSessions(call: Call) {
  return listOf(call.state.sessions, call.form, '/v1/checkout/sessions');
}

/** What the hosted page does when its form is sent. */
export function completeCheckout(call: Call, session: CheckoutSession, methodId: string): void {
  if (session.status !== 'open')
    throw invalid('This page has been used.', { code: 'resource_already_complete' });
  const intent = mustFind(call.state.setupIntents, session.setup_intent, 'setupintent');
  succeedSetup(call, intent, methodId);
  session.status = 'complete';
  session.url = null;
  emitEvent(call, 'checkout.session.completed', session);
}

function succeedSetup(call: Call, intent: SetupIntent, given: string | undefined): SetupIntent {
  const methodId = given ?? intent.payment_method;
  if (intent.status === 'succeeded' || intent.status === 'canceled' || methodId === null) {
    throw invalid(`You cannot confirm this SetupIntent because it has a status of ${intent.status}.`, {
      code: 'setup_intent_unexpected_state',
    });
  }
  intent.payment_method =
    intent.customer === null ? methodId : methodForCustomer(call, methodId, intent.customer).id;
  intent.status = 'succeeded';
  emitEvent(call, 'setup_intent.succeeded', intent);
  return intent;
}

function makeSetupIntent(call: Call, customer: string | null, given: Record<string, string>): SetupIntent {
  const id = newPaymentId('seti');
  const intent: SetupIntent = {
    id,
    object: 'setup_intent',
    created: seconds(call),
    livemode: false,
    status: 'requires_payment_method',
    customer,
    payment_method: null,
    usage: 'off_session',
    client_secret: `${id}_secret_${newPaymentId('s').slice(3, 15)}`,
    metadata: given,
  };
  call.state.setupIntents[id] = intent;
  emitEvent(call, 'setup_intent.created', intent);
  return intent;
}
