import type { Metadata } from 'next';
import Link from 'next/link';

import { readOnServer } from '@/app/_kit/prefetch';
import { signInWithLink } from '@/app/_kit/sign-in';
import { OneButtonForm } from '@/components/people/one-button-form';
import { PublicPage } from '@/components/people/public-page';
import { readMailedLinkEndpoint } from '@/lib/people/endpoints';
import { safeNext } from '@/lib/people/safe-next';

export const metadata: Metadata = { title: 'Sign in', referrer: 'no-referrer' };

interface Props {
  params: Promise<{ token: string }>;
  searchParams: Promise<{ next?: string }>;
}

/** Opening it uses nothing up: mail scanners open every address. The press does. */
export default async function SignInLinkPage({ params, searchParams }: Props) {
  const { token } = await params;
  const link =
    token.length < 20 || token.length > 200 ? null : await readOnServer(readMailedLinkEndpoint, { token });
  if (link?.state !== 'open' || link.purpose !== 'sign_in') {
    return (
      <PublicPage title="Sign in" lead="This link was used, or its time is over.">
        <p>
          <Link href="/sign-in/link" className="lw-word-button">
            Mail me another one
          </Link>
        </p>
      </PublicPage>
    );
  }
  return (
    <PublicPage title="Sign in" lead={`This link signs in ${link.name ?? ''}, ${link.email ?? ''}, once.`}>
      <OneButtonForm
        action={signInWithLink}
        fields={{ token, next: safeNext((await searchParams).next) }}
        busyLabel="Signing in"
      >
        {`Sign in as ${link.name ?? ''}`}
      </OneButtonForm>
    </PublicPage>
  );
}
