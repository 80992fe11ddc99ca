import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { signInWithForm } from '@/app/_kit/sign-in';
import { AccountScreen } from '@/components/settings/account-screen';
import { getAccountEndpoint } from '@/lib/people/endpoints';

export const metadata: Metadata = { title: 'My account' };

export default function AccountPage() {
  return (
    <Prefetched queries={[ask(getAccountEndpoint, {})]}>
      <AccountScreen signIn={signInWithForm} page="/settings/account" />
    </Prefetched>
  );
}
