'use client';
import { useState } from 'react';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { requestReset, requestSignInLink } from '@/lib/people/account-contract';

import { FormRefusal } from './public-page';

interface MailMeFormProps {
  for: 'sign_in' | 'reset';
  next?: string;
}

/** Asks for a link by mail. The answer is the same for every address. */
export function MailMeForm({ for: purpose, next }: MailMeFormProps) {
  const [sentTo, setSentTo] = useState<string | null>(null);
  const link = useWrite(requestSignInLink);
  const reset = useWrite(requestReset);
  const form = useForm({ defaultValues: { email: '' } });
  const send = form.handleSubmit(({ email }) => {
    const outcome = { onSuccess: () => setSentTo(email), onError: showOnForm(form) };
    if (purpose === 'reset') reset.mutate({ email }, outcome);
    else link.mutate({ email, ...(next === undefined ? {} : { next }) }, outcome);
  });
  if (sentTo !== null) {
    return (
      <div role="status">
        <p>
          If <strong>{sentTo}</strong> has an account, a link is on its way. It works once, for{' '}
          {purpose === 'reset' ? 'an hour' : '20 minutes'}.
        </p>
        <p className="pt-2 text-quiet">
          Nothing there in two minutes? Look among the unwanted mails, then ask again.
        </p>
      </div>
    );
  }
  const { errors } = form.formState;
  return (
    <form noValidate onSubmit={(event) => void send(event)} className="flex flex-col gap-4">
      <TextField
        label="E-mail"
        type="email"
        autoComplete="username"
        autoFocus
        error={errors.email?.message}
        {...form.register('email', { required: 'Enter your e-mail address.' })}
      />
      <FormRefusal says={errors.root?.message} />
      <div>
        <Button
          type="submit"
          look="primary"
          size="big"
          busy={link.isPending || reset.isPending}
          busyLabel="Sending"
        >
          {purpose === 'reset' ? 'Mail me a link to choose one' : 'Mail me a link'}
        </Button>
      </div>
    </form>
  );
}
