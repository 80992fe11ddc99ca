'use client';
import { useTransition } from 'react';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { FormRefusal } from '@/components/people/public-page';
import type { SignInAction } from '@/components/people/sign-in-state';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { changePassword } from '@/lib/people/account-contract';

/** Every session ends with the old password; this browser goes straight in with the new one. */
export function PasswordForm({ signIn, page }: { signIn: SignInAction; page: string }) {
  const write = useWrite(changePassword);
  const [isEntering, enter] = useTransition();
  const form = useForm({ defaultValues: { current: '', password: '' } });
  const { errors } = form.formState;
  const done = (email: string, password: string) => {
    const fields = new FormData();
    for (const [name, value] of Object.entries({ email, password, next: page })) fields.set(name, value);
    form.reset();
    enter(async () => {
      await signIn({}, fields);
      showMessage({ says: 'Password changed. Your other sessions have ended.' });
    });
  };
  const save = form.handleSubmit((typed) =>
    write.mutate(typed, { onSuccess: ({ email }) => done(email, typed.password), onError: showOnForm(form) }),
  );
  return (
    <form noValidate onSubmit={(event) => void save(event)} className="flex flex-col gap-3 pt-1">
      <div className="grid gap-3 md:grid-cols-2">
        <TextField
          label="Password you have now"
          type="password"
          autoComplete="current-password"
          error={errors.current?.message}
          {...form.register('current')}
        />
        <TextField
          label="New password"
          type="password"
          autoComplete="new-password"
          hint="12 characters or more"
          error={errors.password?.message}
          {...form.register('password')}
        />
      </div>
      <FormRefusal says={errors.root?.message} />
      <div>
        <Button type="submit" busy={write.isPending || isEntering} busyLabel="Changing">
          Change the password
        </Button>
      </div>
    </form>
  );
}
