'use client';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useRead, useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import {
  inviteColleague,
  listColleagues,
  setColleagueActive,
  type Colleague,
} from '@/lib/people/team-contract';

import { FormRefusal } from './public-page';

/** Who of a processor has an account, and who is asked in. */
export function Colleagues() {
  const { data } = useRead(listColleagues, {});
  return (
    <Section title="People with an account here" note="each sees all batches of your company">
      <Table
        label="People with an account"
        columns={[{ says: 'Name' }, { says: 'E-mail' }, { says: 'Action', hidden: true, right: true }]}
      >
        {data.people.map((person) => (
          <ColleagueRow key={person.personId} person={person} />
        ))}
      </Table>
      <InviteColleague />
    </Section>
  );
}

function ColleagueRow({ person }: { person: Colleague }) {
  const write = useWrite(setColleagueActive, { refreshes: [listColleagues] });
  const { personId, name, email, active, isMe } = person;
  const change = () =>
    write.mutate(
      { personId, active: !active },
      {
        onSuccess: () =>
          showMessage({ says: active ? `${name} can no longer enter.` : `${name} can enter again.` }),
        onError: (error) => showMessage({ says: error.message, failed: true }),
      },
    );
  return (
    <Row state={active ? 'rest' : 'off'}>
      <Cell strong>
        {name}
        {isMe && <span className="font-normal text-quiet"> you</span>}
      </Cell>
      <Cell head="E-mail">{email}</Cell>
      <Cell right>
        {!isMe && (
          <Button look="word" busy={write.isPending} onClick={change}>
            {active ? 'Close' : 'Let in again'}
            <span className="sr-only"> {name}</span>
          </Button>
        )}
      </Cell>
    </Row>
  );
}

function InviteColleague() {
  const write = useWrite(inviteColleague, { refreshes: [listColleagues] });
  const form = useForm({ defaultValues: { name: '', email: '' } });
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
    <form noValidate onSubmit={(event) => void send(event)} className="flex flex-col gap-3 pt-3">
      <div className="grid gap-3 md:grid-cols-2">
        <TextField
          label="Name of a colleague"
          autoComplete="off"
          error={errors.name?.message}
          {...form.register('name')}
        />
        <TextField
          label="E-mail"
          type="email"
          autoComplete="off"
          error={errors.email?.message}
          {...form.register('email')}
        />
      </div>
      <FormRefusal says={errors.root?.message} />
      <div>
        <Button type="submit" busy={write.isPending} busyLabel="Sending">
          Send the invitation
        </Button>
      </div>
    </form>
  );
}
