import type { Metadata } from 'next';

import { PayoutAccount } from '@/components/payments/payout-account';
import { PageHead } from '@/components/ui/page-head';

import { PortalFrame } from '../portal-frame';

export const metadata: Metadata = { title: 'Account' };

interface AccountPageProps {
  searchParams: Promise<{ back?: string; again?: string }>;
}

export default async function AccountPage({ searchParams }: AccountPageProps) {
  const { back, again } = await searchParams;
  return (
    <PortalFrame>
      <PageHead title="Account" />
      <div className="max-w-prose">
        <PayoutAccount came={cameFrom(back, again)} />
      </div>
    </PortalFrame>
  );
}

function cameFrom(back: string | undefined, again: string | undefined): 'back' | 'again' | null {
  if (back !== undefined) return 'back';
  return again === undefined ? null : 'again';
}
