import type { Metadata } from 'next';
import { redirect } from 'next/navigation';

import { viewer } from '@/app/_kit/prefetch';
import { signInWithForm } from '@/app/_kit/sign-in';
import { PublicPage } from '@/components/people/public-page';
import { SignInForm } from '@/components/people/sign-in-form';
import { safeNext } from '@/lib/people/safe-next';

const LEAD = 'Out, proved, back: your batches, their processors and their papers.';
/** Whoever came by a mailed link has no password: the way on is the mail. */
const LINK_ENDED =
  'The link to this batch has ended on this device. Open it again from the newest mail about the batch, or sign in if you have an account.';

export const metadata: Metadata = { title: 'Sign in' };

export default async function SignInPage({
  searchParams,
}: {
  searchParams: Promise<{ next?: string; email?: string; error?: string }>;
}) {
  const { next, email, error } = await searchParams;
  const to = safeNext(next);
  if ((await viewer()).actor.kind === 'person' && error === undefined) redirect(to);
  return (
    <PublicPage title="Sign in" lead={to.startsWith('/portal/batches/') ? LINK_ENDED : LEAD}>
      <SignInForm
        action={signInWithForm}
        next={to}
        email={email?.slice(0, 254)}
        refused={error === undefined ? undefined : 'You were not signed in. Try again.'}
      />
    </PublicPage>
  );
}
