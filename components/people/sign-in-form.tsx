'use client';
import Link from 'next/link';
import { useActionState } from 'react';

import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';

import { FormRefusal } from './public-page';
import type { SignInAction } from './sign-in-state';

interface SignInFormProps {
  action: SignInAction;
  next: string;
  email?: string | undefined;
  /** What an earlier try was refused with, where the page itself was loaded anew. */
  refused?: string | undefined;
}

/** Works before any script has come: the fields are a plain form. */
export function SignInForm({ action, next, email, refused }: SignInFormProps) {
  const [state, submit, isPending] = useActionState(action, {
    ...(email ? { email } : {}),
    ...(refused ? { says: refused } : {}),
  });
  const query = next === '/' ? '' : `?next=${encodeURIComponent(next)}`;
  return (
    <>
      <form action={submit} className="flex flex-col gap-4">
        <input type="hidden" name="next" value={next} />
        <TextField
          label="E-mail"
          name="email"
          type="email"
          autoComplete="username"
          required
          defaultValue={state.email}
          key={state.email}
          autoFocus={!state.email}
        />
        <TextField
          label="Password"
          name="password"
          type="password"
          autoComplete="current-password"
          required
          autoFocus={Boolean(state.email)}
        />
        <FormRefusal says={state.says} />
        <div>
          <Button type="submit" look="primary" size="big" busy={isPending} busyLabel="Signing in">
            Sign in
          </Button>
        </div>
      </form>
      <p className="flex flex-wrap gap-x-5 border-t border-rule pt-3">
        <Link href={`/sign-in/link${query}`} className="lw-word-button">
          Mail me a link instead
        </Link>
        <Link href="/sign-in/forgotten" className="lw-word-button">
          Choose a new password
        </Link>
      </p>
    </>
  );
}
