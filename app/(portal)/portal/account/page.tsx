import type { Metadata } from 'next';

import { PayoutAccount } from '@/components/payments/payout-account';

export const metadata: Metadata = { title: 'Account' };

export default async function PortalAccountPage({ searchParams }: { searchParams: Promise<{ back?: string; again?: string }> }) {
  const { back, again } = await searchParams;
  const came = (again === '1' && 'again') || (back === '1' && 'back') || null;
  return <PayoutAccount came={came} />;
}
