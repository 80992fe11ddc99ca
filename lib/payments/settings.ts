import Stripe from 'stripe';

import { AppError } from '@/lib/errors';

import { ownStripe } from './stripe-client';

/** Whether money may be sent to a processor's account just now. */
export async function canReceive(account: string, stripe: Stripe = ownStripe()): Promise<boolean> {
  const found = await stripe.accounts.retrieve(account);
  return found.payouts_enabled && found.capabilities?.transfers === 'active';
}

/** The shop a customer stands for, by what we gave it to carry, and the method it saved last. */
export async function getCustomerMethod(
  customer: string,
  stripe: Stripe = ownStripe(),
): Promise<{ shopId: string | null; paymentMethod: string | null }> {
  const found = await stripe.customers.retrieve(customer);
  const newest = await stripe.customers.listPaymentMethods(customer, { limit: 1 });
  return {
    shopId: found.deleted === true ? null : (found.metadata['shop_id'] ?? null),
    paymentMethod: newest.data[0]?.id ?? null,
  };
}

/** How a person knows a saved method: `bank account ··6789`. Null while the service does not answer. */
export async function methodWords(
  paymentMethod: string,
  stripe: Stripe = ownStripe(),
): Promise<string | null> {
  try {
    const {
      card,
      us_bank_account: bank,
      type,
    } = await stripe.paymentMethods.retrieve(paymentMethod, {}, { maxNetworkRetries: 0, timeout: 4_000 });
    if (card) return `card ··${card.last4}`;
    return bank?.last4 ? `bank account ··${bank.last4}` : type.replaceAll('_', ' ');
  } catch (error) {
    if (error instanceof Stripe.errors.StripeError) return null;
    throw error;
  }
}

/** What a person at a screen is told of a request that the service refuses, instead of a failure of ours. */
export async function toldInWords<T>(work: () => Promise<T>): Promise<T> {
  try {
    return await work();
  } catch (error) {
    if (!(error instanceof Stripe.errors.StripeError)) throw error;
    throw new AppError('conflict', `The payment service refused this: ${error.message}`);
  }
}
