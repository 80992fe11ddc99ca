import { eq } from 'drizzle-orm';
import type { drizzle } from 'drizzle-orm/node-postgres';

import { processors, shops } from '@/db/schema/organisations';
import { env } from '@/lib/env';
import {
  createConnectedAccount,
  createCustomer,
  createOnboardingLink,
  savePaymentMethod,
} from '@/lib/payments/payments';

import type { DemoOrganisations } from './organisations';

/**
 * Lets the yards pay and the processors be paid, at the stand-in for payments: a saved card each, accounts that have
 * gone through onboarding. With a payment service of one's own nothing is made up there, and the pages ask for it.
 */
export async function seedPaymentService(
  owner: ReturnType<typeof drizzle>,
  cast: DemoOrganisations,
): Promise<void> {
  if (env.STRIPE_API_BASE === undefined) return;
  for (const [shopId, name] of [
    [cast.shopId, 'Merganser Cove Aircraft'],
    [cast.otherShopId, 'Larkspur Sheet Metal'],
  ] as const) {
    const stripeCustomerId = await createCustomer({ name, email: 'office@merganser.test', shopId });
    const stripePaymentMethodId = await savePaymentMethod({
      customer: stripeCustomerId,
      paymentMethod: 'pm_card_visa',
    });
    await owner.update(shops).set({ stripeCustomerId, stripePaymentMethodId }).where(eq(shops.id, shopId));
  }
  for (const processor of Object.values(cast.processors)) {
    const account = await createConnectedAccount({
      name: processor.name,
      email: 'desk@processor.test',
      country: 'US',
      processorId: processor.id,
    });
    const url = await createOnboardingLink({ account, returnUrl: env.APP_URL, refreshUrl: env.APP_URL });
    // What a person does on the service's page: names a bank account and sends the form.
    await fetch(url, {
      method: 'POST',
      body: new URLSearchParams({
        name: processor.name,
        bank: 'Harbour Bank',
        account_number: '000123456789',
      }),
      redirect: 'manual',
    });
    await owner
      .update(processors)
      .set({ stripeAccountId: account, payoutsReady: true })
      .where(eq(processors.id, processor.id));
  }
}
