import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { signInWithForm } from '@/app/_kit/sign-in';
import { Invitation, InvitationEnded } from '@/components/people/invitation';
import { readInvitationEndpoint } from '@/lib/people/endpoints';

export const metadata: Metadata = { title: 'Invitation', referrer: 'no-referrer' };

export default async function InvitationPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  if (token.length < 20 || token.length > 200) return <InvitationEnded state="unknown" />;
  return (
    <Prefetched queries={[ask(readInvitationEndpoint, { token })]}>
      <Invitation token={token} signIn={signInWithForm} />
    </Prefetched>
  );
}
