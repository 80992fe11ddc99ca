'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useLazyRead, useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Edge } from '@/components/ui/edge';
import { Failing } from '@/components/ui/failing';
import { SelectField } from '@/components/ui/field';
import { Loading } from '@/components/ui/loading';
import { Section } from '@/components/ui/section';
import { getPayoutAccount, linkPayoutAccount, PAYOUT_COUNTRIES } from '@/lib/payments/contract';

const EVERY_MS = 2_000;
type State = 'none' | 'unfinished' | 'ready';

const STATE_WORDS: Record<State, { says: string; more: string; verb: string }> = {
  none: {
    says: 'You have not said where your money goes.',
    more: 'Until you do, shops cannot pay you here.',
    verb: 'Say where it goes',
  },
  unfinished: {
    says: 'The payment service still asks for something.',
    more: 'Go on where you stopped.',
    verb: 'Go on',
  },
  ready: {
    says: 'Shops can pay you.',
    more: 'The money goes straight to your bank account; each payment brings a mail that says what it is for.',
    verb: 'Look at it or change it',
  },
};

/** Where a processor is paid; only for people who are signed in, never for the link of one batch. */
export function PayoutAccount({ came }: { came: 'back' | 'again' | null }) {
  const { data, error } = useLazyRead(
    getPayoutAccount,
    {},
    { refreshEveryMs: EVERY_MS * (came === 'back' ? 1 : 30) },
  );
  return (
    <Section title="Where your money goes">
      {!data && !error && <Loading rows={1} label="Loading the account" />}
      {error && <Failing says={error.message} />}
      {came === 'again' && (
        <Edge level="note">The page was used already, or too long ago. Open a new one.</Edge>
      )}
      {data && <Standing state={data.state} came={came} />}
    </Section>
  );
}

function Standing({ state, came }: { state: State; came: 'back' | 'again' | null }) {
  const words = STATE_WORDS[state];
  const form = useForm<{ country: (typeof PAYOUT_COUNTRIES)[number] }>({
    resolver: zodResolver(linkPayoutAccount.input),
    defaultValues: { country: 'US' },
  });
  const link = useWrite(linkPayoutAccount);
  const { errors } = form.formState;
  const open = form.handleSubmit(async (values) => {
    const page = await link.mutateAsync(values, { onError: showOnForm(form) }).catch(() => null);
    if (page) window.location.assign(page.url);
  });
  return (
    <form noValidate onSubmit={open} className="flex max-w-md flex-col gap-3 pt-1">
      <p role="status">
        <strong className={state === 'ready' ? 'text-proved-ink' : ''}>{words.says}</strong>{' '}
        <span className="text-quiet">
          {state === 'unfinished' && came === 'back'
            ? 'It may take a moment; this page follows by itself.'
            : words.more}
        </span>
      </p>
      {state === 'none' && (
        <SelectField
          label="Country of the bank account"
          options={PAYOUT_COUNTRIES.map((code) => ({ value: code, says: countryName(code) }))}
          error={errors.country?.message}
          {...form.register('country')}
        />
      )}
      {errors.root && (
        <p role="alert" className="text-held-ink">
          {errors.root.message}
        </p>
      )}
      <div>
        <Button
          look={state === 'ready' ? 'outlined' : 'primary'}
          type="submit"
          busy={link.isPending}
          busyLabel="Opening the page"
        >
          {words.verb}
        </Button>
      </div>
      <p className="text-second text-quiet">
        It opens the payment service’s own page. Account numbers never pass through Lotwright.
      </p>
    </form>
  );
}

const names = new Intl.DisplayNames('en', { type: 'region' });
const countryName = (code: string): string => names.of(code) ?? code;
