import type { Metadata } from 'next';
import Link from 'next/link';

import { readOnServer } from '@/app/_kit/prefetch';
import { signInWithForm } from '@/app/_kit/sign-in';
import { ResetForm } from '@/components/people/new-password-form';
import { PublicPage } from '@/components/people/public-page';
import { readMailedLinkEndpoint } from '@/lib/people/endpoints';

export const metadata: Metadata = { title: 'Choose a new password', referrer: 'no-referrer' };

export default async function ResetPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const link =
    token.length < 20 || token.length > 200 ? null : await readOnServer(readMailedLinkEndpoint, { token });
  if (link?.state !== 'open' || link.purpose !== 'reset') {
    return (
      <PublicPage title="Choose a new password" lead="This link was used, or its time is over.">
        <p>
          <Link href="/sign-in/forgotten" className="lw-word-button">
            Mail me another one
          </Link>
        </p>
      </PublicPage>
    );
  }
  return (
    <PublicPage
      title="Choose a new password"
      lead={`For ${link.name ?? ''}, ${link.email ?? ''}. Every session of yours ends and this browser signs in anew.`}
    >
      <ResetForm token={token} email={link.email ?? ''} signIn={signInWithForm} />
    </PublicPage>
  );
}
