import type { Metadata } from 'next';

import { PayingMethod } from '@/components/payments/paying-method';

export const metadata: Metadata = { title: 'How the shop pays' };

export default async function PaymentsSettingsPage({
  searchParams,
}: {
  searchParams: Promise<{ saved?: string }>;
}) {
  return <PayingMethod justSaved={(await searchParams).saved === '1'} />;
}
