'use client';
import { useRouter } from 'next/navigation';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { FormRefusal } from '@/components/people/public-page';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { getAccount, updateAccount } from '@/lib/people/account-contract';
import { getMe } from '@/lib/session/contract';

export function NameForm({ name, email }: { name: string; email: string }) {
  const router = useRouter();
  const write = useWrite(updateAccount, { refreshes: [getAccount, getMe] });
  const form = useForm({ defaultValues: { name } });
  const { errors } = form.formState;
  const saved = () => {
    showMessage({ says: 'Name saved. Papers that are signed keep the name they were signed with.' });
    router.refresh();
  };
  const save = form.handleSubmit((typed) =>
    write.mutate(typed, { onSuccess: saved, onError: showOnForm(form) }),
  );
  return (
    <form noValidate onSubmit={(event) => void save(event)} className="flex flex-col gap-3 pt-1">
      <div className="grid gap-3 md:grid-cols-2">
        <TextField label="Name" autoComplete="name" error={errors.name?.message} {...form.register('name')} />
        <TextField label="E-mail" frozen="what you sign in with" defaultValue={email} />
      </div>
      <FormRefusal says={errors.root?.message} />
      <div>
        <Button type="submit" busy={write.isPending} busyLabel="Saving">
          Save the name
        </Button>
      </div>
    </form>
  );
}
