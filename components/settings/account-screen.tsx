'use client';
import { useRouter } from 'next/navigation';

import { useRead, useWrite } from '@/components/api/use-api';
import type { SignInAction } from '@/components/people/sign-in-state';
import { Button, ButtonLink } from '@/components/ui/button';
import { Checkbox, RadioGroup } from '@/components/ui/choice';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { useMay, useMe } from '@/components/session/use-me';
import {
  endMySessions,
  getAccount,
  requestReset,
  updateAccount,
  type Account,
} from '@/lib/people/account-contract';
import { getMe } from '@/lib/session/contract';

import { NameForm } from './name-form';
import { PasswordForm } from './password-form';

interface AccountSectionsProps {
  /** Signs in anew after the password was changed. */
  signIn: SignInAction;
  /** The page that shows these sections; the way back after the password was changed. */
  page: string;
}

export function AccountScreen(props: AccountSectionsProps) {
  const { data: account } = useRead(getAccount, {});
  return (
    <>
      <PageHead title="My account" sub={account.email} />
      <AccountSections {...props} />
    </>
  );
}

/** What belongs to the person, whichever organisation they work for just now. */
export function AccountSections({ signIn, page }: AccountSectionsProps) {
  const { data: account } = useRead(getAccount, {});
  const signs = useMay('certificate.prove');
  return (
    <div className="flex max-w-[40rem] flex-col gap-7">
      <Section title="Name">
        <NameForm name={account.name} email={account.email} />
      </Section>
      <Choices account={account} />
      <Section title="Password" note={passwordNote(account, signs)}>
        {account.hasPassword ? (
          <PasswordForm signIn={signIn} page={page} />
        ) : (
          <FirstPassword email={account.email} />
        )}
      </Section>
      <Sessions />
      {account.organisations.length > 1 && <Organisations account={account} />}
    </div>
  );
}

function passwordNote({ hasPassword }: Account, signs: boolean): string | undefined {
  if (!hasPassword) return 'you sign in by mailed link';
  return signs ? 'also what you sign certificates with' : undefined;
}

function Choices({ account }: { account: Account }) {
  const router = useRouter();
  const write = useWrite(updateAccount, { refreshes: [getAccount, getMe] });
  const keep = (change: { units?: 'inch' | 'metric'; singleKeys?: boolean }) =>
    write.mutate(change, {
      onSuccess: () => {
        showMessage({ says: 'Kept for every device of yours.' });
        router.refresh();
      },
      onError: (error) => showMessage({ says: error.message, failed: true }),
    });
  return (
    <Section title="How I read and type">
      <div className="grid gap-x-9 gap-y-3 pt-1 md:grid-cols-2">
        <RadioGroup
          label="Units"
          hint="What is stored stays as it was entered."
          options={[
            { value: 'inch', says: 'inch and °F' },
            { value: 'metric', says: 'mm and °C' },
          ]}
          chosen={[account.units]}
          onChange={(event) => keep({ units: event.currentTarget.value === 'metric' ? 'metric' : 'inch' })}
        />
        <Checkbox
          says="Single keys"
          note="J, K, G and others; ? lists them. Switch off for speech input."
          defaultChecked={account.singleKeys}
          onChange={(event) => keep({ singleKeys: event.currentTarget.checked })}
        />
      </div>
    </Section>
  );
}

function FirstPassword({ email }: { email: string }) {
  const write = useWrite(requestReset);
  if (write.isSuccess)
    return <p role="status">A link is on its way to {email}. It works once, for an hour.</p>;
  return (
    <div className="flex flex-wrap items-center gap-3 pt-1">
      <Button
        busy={write.isPending}
        busyLabel="Sending"
        onClick={() =>
          write.mutate({ email }, { onError: (error) => showMessage({ says: error.message, failed: true }) })
        }
      >
        Mail me a link to choose one
      </Button>
    </div>
  );
}

function Sessions() {
  const router = useRouter();
  const write = useWrite(endMySessions);
  const hasTokens = useMay('token.manage');
  return (
    <Section title="Sessions">
      <p className="pt-1 text-quiet">
        A lost telephone, a shared machine: this ends every session of yours, here too.
        {hasTokens && ' Tokens for programs stay.'}
      </p>
      <div className="pt-2.5">
        <Button
          busy={write.isPending}
          busyLabel="Signing out"
          onClick={() =>
            write.mutate(
              {},
              {
                onSuccess: () => router.push('/sign-in'),
                onError: (error) => showMessage({ says: error.message, failed: true }),
              },
            )
          }
        >
          Sign out everywhere
        </Button>
      </div>
    </Section>
  );
}

/** The choice is a page outside the shop, so that nothing read for one organisation is still there for the next. */
function Organisations({ account }: { account: Account }) {
  const current = useMe()?.organisation.id;
  return (
    <Section title="For whom I work">
      <ul>
        {account.organisations.map(({ membershipId, id, name, roles }) => (
          <li key={membershipId} className="border-b border-rule py-2">
            <strong>{name}</strong>{' '}
            <span className="text-quiet">
              {roles.join(', ')}
              {id === current && ', just now'}
            </span>
          </li>
        ))}
      </ul>
      <div className="pt-2.5">
        <ButtonLink href="/sign-in/organisation">Work for another one</ButtonLink>
      </div>
    </Section>
  );
}
