import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Done } from '@/lib/api/shapes';

export const receivePaymentEvent = declare({
  id: 'receivePaymentEvent',
  method: 'post',
  path: '/webhooks/payments',
  summary: 'Events of the payment service; taken as they come, believed by their signature alone',
  side: 'public',
  permission: 'public.use',
  /** Made from the raw body and the header `stripe-signature`, because a signature is over bytes. */
  input: z.object({ body: z.string(), signature: z.string().nullable() }),
  response: Done,
});

/** The payment service's own page; good once and for a short while. */
const PageLink = z.object({ url: z.url() });

export const getPayingMethod = declare({
  id: 'getPayingMethod',
  method: 'get',
  path: '/payments/method',
  summary: 'How the shop pays',
  side: 'shop',
  permission: 'shop.settings',
  input: z.object({}),
  /** `says` is null while the payment service does not answer. */
  response: z.object({ saved: z.boolean(), says: z.string().nullable() }),
});

export const linkPayingMethod = declare({
  id: 'linkPayingMethod',
  method: 'post',
  path: '/payments/method/link',
  summary: 'Get the page on which the shop saves how it pays',
  side: 'shop',
  permission: 'shop.settings',
  input: z.object({}),
  response: PageLink,
});

export const PAYOUT_COUNTRIES = [
  'US',
  'CA',
  'GB',
  'DE',
  'FR',
  'NL',
  'SE',
  'NO',
  'DK',
  'CH',
  'AU',
  'NZ',
] as const;

export const getPayoutAccount = declare({
  id: 'getPayoutAccount',
  method: 'get',
  path: '/payments/account',
  summary: 'Where the processor is paid',
  side: 'portal',
  permission: 'portal.account',
  input: z.object({}),
  /** `none`: never begun; `unfinished`: the service still asks for something; `ready`: shops can pay. */
  response: z.object({ state: z.enum(['none', 'unfinished', 'ready']) }),
});

export const linkPayoutAccount = declare({
  id: 'linkPayoutAccount',
  method: 'post',
  path: '/payments/account/link',
  summary: 'Get the page on which the processor says where its money goes',
  side: 'portal',
  permission: 'portal.account',
  input: z.object({ country: z.enum(PAYOUT_COUNTRIES, 'Choose the country of your bank account.') }),
  response: PageLink,
});
