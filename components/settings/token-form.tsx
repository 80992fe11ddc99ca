'use client';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { FormRefusal } from '@/components/people/public-page';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/choice';
import { DateField, FieldError, TextField } from '@/components/ui/field';
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
        <fieldset aria-describedby={errors.scopes ? 'scopes-error' : undefined}>
          <legend className="font-cond text-word leading-[1.125rem]">It may</legend>
          {[...byThing(scopes)].map(([thing, verbs]) => (
            <div key={thing} className="flex flex-wrap items-center gap-x-6 border-b border-rule py-1">
              <span aria-hidden="true" className="w-32 flex-none font-cond text-word">
                {thing}
              </span>
              {verbs.map((verb) => (
                <Checkbox
                  key={verb}
                  value={`${thing}.${verb}`}
                  says={
                    <>
                      <span className="sr-only">{thing} </span>
                      {verb.replaceAll('_', ' ')}
                    </>
                  }
                  {...form.register('scopes')}
                />
              ))}
            </div>
          ))}
          {errors.scopes?.message && <FieldError id="scopes-error" says={errors.scopes.message} />}
        </fieldset>
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

/** `batch.read`, `batch.build` → batch: read, build. */
function byThing(scopes: readonly string[]): Map<string, string[]> {
  const things = new Map<string, string[]>();
  for (const scope of scopes) {
    const [thing = '', verb = ''] = scope.split('.');
    things.set(thing, [...(things.get(thing) ?? []), verb]);
  }
  return things;
}
