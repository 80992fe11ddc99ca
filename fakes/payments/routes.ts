import { createAccount, createAccountLink, getAccount, listAccounts, updateAccount } from './accounts';
import { listOf, mustFind, seconds } from './call';
import type { Call } from './call';
import { createCustomer, getCustomer, listCustomers, updateCustomer } from './customers';
import { invalid } from './payment-fault';
import {
  cancelPaymentIntent,
  confirmPaymentIntent,
  createPaymentIntent,
  getPaymentIntent,
  listPaymentIntents,
} from './payment-intents';
import {
  attachPaymentMethod,
  createPaymentMethod,
  detachPaymentMethod,
  getPaymentMethod,
  listPaymentMethods,
} from './payment-methods';
import { createRefund, getRefund, listRefunds } from './refunds';
import {
  confirmSetupIntent,
  createCheckoutSession,
  createSetupIntent,
  getCheckoutSession,
  getSetupIntent,
  listCheckoutSessions,
} from './setup-intents';
import { createTransfer, getTransfer, listTransfers } from './transfers';

type Handler = (call: Call) => unknown;

/** All of the interface that is spoken here. What is not on this list answers 404, as an unknown address does. */
const ROUTES: Readonly<Record<string, Handler>> = {
  'GET /v1/account': ownAccount,
  'GET /v1/balance': balance,

  'POST /v1/accounts': createAccount,
  'GET /v1/accounts': listAccounts,
  'GET /v1/accounts/:id': getAccount,
  'POST /v1/accounts/:id': updateAccount,
  'POST /v1/account_links': createAccountLink,

  'POST /v1/customers': createCustomer,
  'GET /v1/customers': listCustomers,
  'GET /v1/customers/:id': getCustomer,
  'POST /v1/customers/:id': updateCustomer,
  'GET /v1/customers/:id/payment_methods': listPaymentMethods,

  'POST /v1/payment_methods': createPaymentMethod,
  'GET /v1/payment_methods': listPaymentMethods,
  'GET /v1/payment_methods/:id': getPaymentMethod,
  'POST /v1/payment_methods/:id/attach': attachPaymentMethod,
  'POST /v1/payment_methods/:id/detach': detachPaymentMethod,

  'POST /v1/setup_intents': createSetupIntent,
  'GET /v1/setup_intents/:id': getSetupIntent,
  'POST /v1/setup_intents/:id/confirm': confirmSetupIntent,

  'POST /v1/checkout/sessions': createCheckoutSession,
  'GET /v1/checkout/sessions': listCheckoutSessions,
  'GET /v1/checkout/sessions/:id': getCheckoutSession,

  'POST /v1/payment_intents': createPaymentIntent,
  'GET /v1/payment_intents': listPaymentIntents,
  'GET /v1/payment_intents/:id': getPaymentIntent,
  'POST /v1/payment_intents/:id/confirm': confirmPaymentIntent,
  'POST /v1/payment_intents/:id/cancel': cancelPaymentIntent,

  'GET /v1/charges': (call) => listOf(call.state.charges, call.form, '/v1/charges'),
  'GET /v1/charges/:id': (call) => mustFind(call.state.charges, call.id, 'charge'),

  'POST /v1/refunds': createRefund,
  'GET /v1/refunds': listRefunds,
  'GET /v1/refunds/:id': getRefund,

  'POST /v1/transfers': createTransfer,
  'GET /v1/transfers': listTransfers,
  'GET /v1/transfers/:id': getTransfer,

  'GET /v1/events': (call) => listOf(call.state.events, call.form, '/v1/events'),
  'GET /v1/events/:id': (call) => mustFind(call.state.events, call.id, 'event'),
};

const PATTERNS = Object.entries(ROUTES).map(([route, handler]) => {
  const [method = '', path = ''] = route.split(' ');
  return { method, pattern: new RegExp(`^${path.replace(':id', '(?<id>[^/]+)')}$`), handler };
});

/** The handler for an address and the id in it, or the refusal of the wire. */
export function routeOf(method: string, path: string): { handler: Handler; id: string } {
  for (const route of PATTERNS) {
    const match = route.method === method ? route.pattern.exec(path) : null;
    if (match) return { handler: route.handler, id: decodeURIComponent(match.groups?.['id'] ?? '') };
  }
  throw invalid(`Unrecognized request URL (${method}: ${path}).`, { status: 404 });
}

function ownAccount(call: Call) {
  return {
    id: 'acct_1Fstandin',
    object: 'account',
    created: seconds(call),
    type: 'standard',
    country: 'US',
    charges_enabled: true,
    payouts_enabled: true,
  };
}

function balance() {
  return {
    object: 'balance',
    livemode: false,
    available: [{ amount: 0, currency: 'usd' }],
    pending: [{ amount: 0, currency: 'usd' }],
  };
}
