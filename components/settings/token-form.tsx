'use client';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { FormRefusal } from '@/components/people/public-page';
import { Button } from '@/components/ui/button';
import { CheckboxGroup } from '@/components/ui/choice';
import { DateField, TextField } from '@/components/ui/field';
import type { Permission } from '@/lib/auth/permissions';
import { createToken, listTokens } from '@/lib/people/token-contract';

interface TokenFormProps {
  /** What this person may hand on. */
  scopes: readonly string[];
  onMade: (made: { name: string; token: string }) => void;
}

export function TokenForm({ scopes, onMade }: TokenFormProps) {
  const write = useWrite(createToken, { refreshes: [listTokens] });
  const form = useForm({ defaultValues: { name: '', lastDay: '', scopes: [] as Permission[] } });
  const { errors } = form.formState;
  const make = form.handleSubmit(({ name, lastDay, scopes: chosen }) =>
    write.mutate(
      { name, lastDay: lastDay === '' ? null : lastDay, scopes: chosen },
      {
        onSuccess: ({ token }) => {
          onMade({ name, token });
          form.reset();
        },
        onError: showOnForm(form),
      },
    ),
  );
  return (
    <form noValidate onSubmit={(event) => void make(event)} className="flex flex-col gap-4 pt-1">
      <div className="grid gap-x-6 gap-y-3 md:grid-cols-2">
        <TextField
          label="What it is for"
          hint="the program, or the machine it runs on"
          autoComplete="off"
          error={errors.name?.message}
          {...form.register('name')}
        />
        <DateField
          label="Last day"
          hint="left empty: until you revoke it"
          error={errors.lastDay?.message}
          {...form.register('lastDay')}
        />
      </div>
      <div>
        <CheckboxGroup
          label="It may"
          className="gap-x-6 md:columns-2 xl:columns-4"
          options={scopes.map((scope) => ({
            value: scope,
            says: scope.replace('.', ': ').replaceAll('_', ' '),
          }))}
          error={errors.scopes?.message}
          {...form.register('scopes')}
        />
      </div>
      <FormRefusal says={errors.root?.message} />
      <div>
        <Button type="submit" look="primary" busy={write.isPending} busyLabel="Making it">
          Make the token
        </Button>
      </div>
    </form>
  );
}
