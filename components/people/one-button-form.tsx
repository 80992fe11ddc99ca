'use client';
import { useActionState, type ReactNode } from 'react';

import { Button } from '@/components/ui/button';

import { FormRefusal } from './public-page';
import type { SignInAction } from './sign-in-state';

interface OneButtonFormProps {
  action: SignInAction;
  /** What goes with the press. */
  fields: Record<string, string>;
  look?: 'primary' | 'outlined';
  busyLabel: string;
  children: ReactNode;
}

/** One button that does one thing, with or without script. */
export function OneButtonForm({ action, fields, look = 'primary', busyLabel, children }: OneButtonFormProps) {
  const [state, submit, isPending] = useActionState(action, {});
  return (
    <form action={submit} className="flex flex-col gap-4">
      {Object.entries(fields).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <FormRefusal says={state.says} />
      <div>
        <Button type="submit" look={look} size="big" busy={isPending} busyLabel={busyLabel}>
          {children}
        </Button>
      </div>
    </form>
  );
}
