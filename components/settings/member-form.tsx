'use client';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { History } from '@/components/audit/history';
import { FormRefusal } from '@/components/people/public-page';
import { Button } from '@/components/ui/button';
import { CheckboxGroup } from '@/components/ui/choice';
import { showMessage } from '@/components/ui/message';
import type { ShopRole } from '@/lib/auth/roles';
import { changeRoles, listPeople, setPersonActive, type TeamMember } from '@/lib/people/team-contract';

import { ROLE_CHOICES } from './role-choices';

/** Opens under a person's row: roles, and the way in. */
export function MemberForm({ person, done }: { person: TeamMember; done: () => void }) {
  const roles = useWrite(changeRoles, { refreshes: [listPeople] });
  const active = useWrite(setPersonActive, { refreshes: [listPeople] });
  const form = useForm({ defaultValues: { roles: person.roles as ShopRole[] } });
  const { errors } = form.formState;
  const { personId, version, name } = person;
  const told = (says: string) => ({
    onSuccess: () => {
      showMessage({ says });
      done();
    },
    onError: showOnForm(form),
  });
  const save = form.handleSubmit((typed) =>
    roles.mutate({ personId, version, ...typed }, told(`Roles of ${name} saved.`)),
  );
  return (
    <form noValidate onSubmit={(event) => void save(event)} className="flex flex-col gap-3 pb-3">
      <CheckboxGroup
        label={`What ${name} may do`}
        options={ROLE_CHOICES}
        error={errors.roles?.message}
        {...form.register('roles')}
      />
      <FormRefusal says={errors.root?.message} />
      <div className="flex flex-wrap gap-2.5">
        <Button type="submit" busy={roles.isPending} busyLabel="Saving">
          Save the roles
        </Button>
        {person.active ? (
          <Button
            look="stop"
            busy={active.isPending}
            busyLabel="Closing"
            onClick={() =>
              active.mutate(
                { personId, version, active: false },
                told(`${name} can no longer enter this shop.`),
              )
            }
          >
            {`Close the way in for ${name}`}
          </Button>
        ) : (
          <Button
            busy={active.isPending}
            busyLabel="Opening"
            onClick={() =>
              active.mutate({ personId, version, active: true }, told(`${name} can enter this shop again.`))
            }
          >
            {`Let ${name} in again`}
          </Button>
        )}
      </div>
      <History entity="person" id={personId} title={`History of ${name}`} />
    </form>
  );
}
