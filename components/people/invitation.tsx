'use client';
import { useRouter } from 'next/navigation';

import { useRead } from '@/components/api/use-api';
import { readInvitation } from '@/lib/people/account-contract';

import { AcceptForm, JoinButton } from './new-password-form';
import { PublicPage } from './public-page';
import type { SignInAction } from './sign-in-state';

const ENDED: Record<string, string> = {
  accepted: 'This invitation was accepted already. Sign in with your e-mail.',
  expired: 'The time of this invitation is over. Ask for another one.',
  withdrawn: 'This invitation was withdrawn. Ask whoever sent it.',
  unknown: 'There is no such invitation. Look whether the whole address was copied.',
};

export function Invitation({ token, signIn }: { token: string; signIn: SignInAction }) {
  const router = useRouter();
  const { data } = useRead(readInvitation, { token });
  const { state, organisation, name, email, roles, hasAccount } = data;
  if (state !== 'open' || organisation === null || email === null) return <InvitationEnded state={state} />;
  return (
    <PublicPage title={`Join ${organisation}`} lead={`You are invited as ${roles.join(', ')}.`}>
      {hasAccount ? (
        <>
          <p>
            {email} has an account. It keeps its name and password and gains {organisation}.
          </p>
          <JoinButton
            token={token}
            organisation={organisation}
            done={(joined) => router.push(`/sign-in?email=${encodeURIComponent(joined)}`)}
          />
        </>
      ) : (
        <AcceptForm token={token} email={email} name={name ?? ''} signIn={signIn} />
      )}
    </PublicPage>
  );
}

/** Why an invitation opens nothing. */
export function InvitationEnded({ state }: { state: string }) {
  return (
    <PublicPage title="Invitation" lead={ENDED[state] ?? ENDED['unknown']}>
      <p>
        <a href="/sign-in" className="lw-word-button">
          Sign in
        </a>
      </p>
    </PublicPage>
  );
}
