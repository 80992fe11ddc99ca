'use client';
import { useTransition } from 'react';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { acceptInvitation, resetPassword } from '@/lib/people/account-contract';

import { FormRefusal } from './public-page';
import type { SignInAction } from './sign-in-state';

interface NewPasswordProps {
  token: string;
  email: string;
  /** Signs in with what was just chosen. */
  signIn: SignInAction;
}

/** After a reset: one field, then straight in. */
export function ResetForm({ token, email, signIn }: NewPasswordProps) {
  const write = useWrite(resetPassword);
  const enter = useEntry(signIn);
  const form = useForm({ defaultValues: { password: '' } });
  const { errors } = form.formState;
  const save = form.handleSubmit(({ password }) =>
    write.mutate(
      { token, password },
      { onSuccess: () => enter.go(email, password), onError: showOnForm(form) },
    ),
  );
  return (
    <form noValidate onSubmit={(event) => void save(event)} className="flex flex-col gap-4">
      <input type="hidden" name="username" autoComplete="username" value={email} readOnly />
      <TextField
        label="New password"
        type="password"
        autoComplete="new-password"
        autoFocus
        hint="12 characters or more; a few words do well."
        error={errors.password?.message}
        {...form.register('password')}
      />
      <FormRefusal says={errors.root?.message} />
      <div>
        <Button
          type="submit"
          look="primary"
          size="big"
          busy={write.isPending || enter.isPending}
          busyLabel="Saving"
        >
          Save and sign in
        </Button>
      </div>
    </form>
  );
}

/** A first account: the name as it will stand on papers, and a password. */
export function AcceptForm({ token, email, name, signIn }: NewPasswordProps & { name: string }) {
  const write = useWrite(acceptInvitation);
  const enter = useEntry(signIn);
  const form = useForm({ defaultValues: { name, password: '' } });
  const { errors } = form.formState;
  const accept = form.handleSubmit((typed) =>
    write.mutate(
      { token, ...typed },
      { onSuccess: () => enter.go(email, typed.password), onError: showOnForm(form) },
    ),
  );
  return (
    <form noValidate onSubmit={(event) => void accept(event)} className="flex flex-col gap-4">
      <TextField
        label="E-mail"
        frozen="the invitation was sent here"
        defaultValue={email}
        autoComplete="username"
      />
      <TextField
        label="Your name"
        autoComplete="name"
        hint="As it will stand on travellers and beside your signature."
        error={errors.name?.message}
        {...form.register('name')}
      />
      <TextField
        label="Password"
        type="password"
        autoComplete="new-password"
        hint="12 characters or more; a few words do well."
        error={errors.password?.message}
        {...form.register('password')}
      />
      <FormRefusal says={errors.root?.message} />
      <div>
        <Button
          type="submit"
          look="primary"
          size="big"
          busy={write.isPending || enter.isPending}
          busyLabel="Making your account"
        >
          Accept and sign in
        </Button>
      </div>
    </form>
  );
}

/** Somebody who has an account already only says yes. */
export function JoinButton({
  token,
  organisation,
  done,
}: {
  token: string;
  organisation: string;
  done: (email: string) => void;
}) {
  const write = useWrite(acceptInvitation);
  return (
    <div className="flex flex-col gap-4">
      <FormRefusal says={write.error?.message} />
      <div>
        <Button
          look="primary"
          size="big"
          busy={write.isPending}
          busyLabel="Joining"
          onClick={() => write.mutate({ token }, { onSuccess: ({ email }) => done(email) })}
        >
          {`Join ${organisation}`}
        </Button>
      </div>
    </div>
  );
}

function useEntry(signIn: SignInAction) {
  const [isPending, start] = useTransition();
  const go = (email: string, password: string) => {
    const form = new FormData();
    form.set('email', email);
    form.set('password', password);
    start(async () => {
      await signIn({}, form);
    });
  };
  return { isPending, go };
}
