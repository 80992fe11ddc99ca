import { momentWords } from '@/lib/day-words';

import { MailLayout } from './layout';
import type { MailProps } from './mail-props';
import { Actions, Say } from './parts';

/** The three mails that let a person in. */

export function InvitationMail({
  organisation,
  inviter,
  name,
  roles,
  url,
  ...until
}: MailProps<'invitation'>) {
  return (
    <MailLayout
      preview={`${inviter} invites you to ${organisation}`}
      title={`${inviter} invites you to ${organisation}`}
      foot={NOT_MEANT}
    >
      <Say>
        {name}, you are asked to work with {organisation} on Lotwright as {listWords(roles)}. The link lets
        you choose your password and works once, until {untilWords(until)}.
      </Say>
      <Actions primary={{ says: 'Accept and choose a password', url }} />
    </MailLayout>
  );
}
export const invitationSubject = ({ organisation }: MailProps<'invitation'>): string =>
  `${organisation} invites you to Lotwright`;

export function ResetMail({ name, url, ...until }: MailProps<'reset'>) {
  return (
    <MailLayout preview="Choose a new password" title="Choose a new password" foot={NOT_ASKED}>
      <Say>
        {name}, somebody asked for a new password for this address. The link works once, until{' '}
        {untilWords(until)}. The password you have now holds until you choose another; then every other
        session of yours ends.
      </Say>
      <Actions primary={{ says: 'Choose a new password', url }} />
    </MailLayout>
  );
}
export const resetSubject = (): string => 'Choose a new password for Lotwright';

export function SignInMail({ name, url, ...until }: MailProps<'sign-in'>) {
  return (
    <MailLayout preview="Your link to sign in" title="Sign in to Lotwright" foot={NOT_ASKED}>
      <Say>
        {name}, this link signs you in without a password. It works once, until {untilWords(until)}.
      </Say>
      <Actions primary={{ says: 'Sign in', url }} />
    </MailLayout>
  );
}
export const signInSubject = (): string => 'Sign in to Lotwright';

const NOT_ASKED =
  'If it was not you who asked, do nothing: without the link nobody gets in. Do not pass this mail on.';
const NOT_MEANT =
  'If you do not know who this is, do nothing. Do not pass this mail on: the link opens your account.';

const untilWords = ({
  expiresAt,
  zone,
  statedAt,
}: {
  expiresAt: string;
  zone: string;
  statedAt: string;
}): string => momentWords(new Date(expiresAt), { zone, now: new Date(statedAt) });

function listWords(words: readonly string[]): string {
  return words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1) ?? ''}`;
}
