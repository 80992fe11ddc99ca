import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { signInWithForm } from '@/app/_kit/sign-in';
import { PayoutAccount } from '@/components/payments/payout-account';
import { Colleagues } from '@/components/people/colleagues';
import { AccountSections } from '@/components/settings/account-screen';
import { PageHead } from '@/components/ui/page-head';
import { getAccountEndpoint, listColleaguesEndpoint } from '@/lib/people/endpoints';

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
      <div className="flex max-w-[40rem] flex-col gap-7">
        <PayoutAccount came={cameFrom(back, again)} />
        <Prefetched queries={[ask(listColleaguesEndpoint, {})]}>
          <Colleagues />
        </Prefetched>
        <Prefetched queries={[ask(getAccountEndpoint, {})]}>
          <AccountSections signIn={signInWithForm} page="/portal/account" />
        </Prefetched>
      </div>
    </PortalFrame>
  );
}

function cameFrom(back: string | undefined, again: string | undefined): 'back' | 'again' | null {
  if (back !== undefined) return 'back';
  return again === undefined ? null : 'again';
}
