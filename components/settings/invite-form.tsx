'use client';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { FormRefusal } from '@/components/people/public-page';
import { Button } from '@/components/ui/button';
import { CheckboxGroup } from '@/components/ui/choice';
import { TextField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import type { ShopRole } from '@/lib/auth/roles';
import { invitePerson, listPeople } from '@/lib/people/team-contract';

import { ROLE_CHOICES } from './role-choices';

export function InviteForm() {
  const write = useWrite(invitePerson, { refreshes: [listPeople] });
  const form = useForm({ defaultValues: { name: '', email: '', roles: [] as ShopRole[] } });
  const { errors } = form.formState;
  const send = form.handleSubmit((typed) =>
    write.mutate(typed, {
      onSuccess: () => {
        showMessage({ says: `The invitation is on its way to ${typed.email}.` });
        form.reset();
      },
      onError: showOnForm(form),
    }),
  );
  return (
    <form
      noValidate
      onSubmit={(event) => void send(event)}
      className="grid gap-x-6 gap-y-3 pt-1 md:grid-cols-2"
    >
      <div className="flex flex-col gap-3">
        <TextField label="Name" autoComplete="off" error={errors.name?.message} {...form.register('name')} />
        <TextField
          label="E-mail"
          type="email"
          autoComplete="off"
          error={errors.email?.message}
          {...form.register('email')}
        />
      </div>
      <CheckboxGroup
        label="Roles"
        options={ROLE_CHOICES}
        error={errors.roles?.message}
        {...form.register('roles')}
      />
      <div className="md:col-span-2">
        <FormRefusal says={errors.root?.message} />
        <Button type="submit" look="primary" busy={write.isPending} busyLabel="Sending">
          Send the invitation
        </Button>
      </div>
    </form>
  );
}
