'use client';
import { useState } from 'react';

import { useRead, useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { useClock } from '@/components/session/use-me';
import {
  listPeople,
  renewInvitation,
  withdrawInvitation,
  type PendingInvitation,
  type TeamMember,
} from '@/lib/people/team-contract';

import { InviteForm } from './invite-form';
import { MemberForm } from './member-form';

/** Who is in the shop, with which roles, and who is asked in. */
export function PeopleScreen() {
  const { data } = useRead(listPeople, {});
  const [openId, setOpenId] = useState<string | null>(null);
  return (
    <>
      <PageHead
        title="People"
        sub="Roles take effect with a person’s next press. Closing an account keeps all they did."
      />
      <div className="flex flex-col gap-7">
        <Section title="In the shop" note={`${data.people.filter((person) => person.active).length} people`}>
          <Table
            label="People of the shop"
            columns={[
              { says: 'Name' },
              { says: 'E-mail' },
              { says: 'Roles' },
              { says: 'Action', hidden: true, right: true },
            ]}
          >
            {data.people.map((person) => (
              <PersonRows
                key={person.personId}
                person={person}
                isOpen={openId === person.personId}
                toggle={() => setOpenId(openId === person.personId ? null : person.personId)}
              />
            ))}
          </Table>
        </Section>
        {data.invitations.length > 0 && (
          <Section title="Invited" note="not yet accepted">
            <Table
              label="Invitations"
              columns={[
                { says: 'Name' },
                { says: 'E-mail' },
                { says: 'Roles' },
                { says: 'Ends' },
                { says: 'Action', hidden: true, right: true },
              ]}
            >
              {data.invitations.map((invitation) => (
                <InvitationRow key={invitation.invitationId} invitation={invitation} />
              ))}
            </Table>
          </Section>
        )}
        <Section title="Invite somebody" note="by mail; the link works once, for 14 days">
          <InviteForm />
        </Section>
      </div>
    </>
  );
}

function PersonRows({ person, isOpen, toggle }: { person: TeamMember; isOpen: boolean; toggle: () => void }) {
  return (
    <>
      <Row state={person.active ? 'rest' : 'off'} selected={isOpen}>
        <Cell strong>
          {person.name}
          {person.isMe && <span className="font-normal text-quiet"> you</span>}
        </Cell>
        <Cell head="E-mail">{person.email}</Cell>
        <Cell head="Roles">{person.active ? person.roles.join(', ') : 'closed'}</Cell>
        <Cell right>
          <Button look="word" aria-expanded={isOpen} onClick={toggle}>
            {isOpen ? 'Leave it' : 'Change'}
            <span className="sr-only"> {person.name}</span>
          </Button>
        </Cell>
      </Row>
      {isOpen && (
        <Row>
          <Cell colSpan={4}>
            <MemberForm person={person} done={toggle} />
          </Cell>
        </Row>
      )}
    </>
  );
}

function InvitationRow({ invitation }: { invitation: PendingInvitation }) {
  const clock = useClock();
  const renew = useWrite(renewInvitation, { refreshes: [listPeople] });
  const withdraw = useWrite(withdrawInvitation, { refreshes: [listPeople] });
  const { invitationId, name, email, roles, expiresAt, isExpired } = invitation;
  const told = (says: string) => ({
    onSuccess: () => showMessage({ says }),
    onError: (error: Error) => showMessage({ says: error.message, failed: true }),
  });
  return (
    <Row>
      <Cell strong>{name}</Cell>
      <Cell head="E-mail">{email}</Cell>
      <Cell head="Roles">{roles.join(', ')}</Cell>
      <Cell head="Ends">
        {isExpired ? (
          <span className="text-held-ink">has ended</span>
        ) : (
          <Moment at={new Date(expiresAt)} clock={clock} />
        )}
      </Cell>
      <Cell right>
        <span className="inline-flex flex-wrap justify-end gap-x-4">
          <Button
            look="word"
            busy={renew.isPending}
            onClick={() =>
              renew.mutate(
                { invitationId },
                told(`Mailed to ${email} once more. The link sent before has ended.`),
              )
            }
          >
            Mail again
          </Button>
          <Button
            look="word"
            busy={withdraw.isPending}
            onClick={() =>
              withdraw.mutate({ invitationId }, told(`The invitation of ${email} is withdrawn.`))
            }
          >
            Withdraw
          </Button>
        </span>
      </Cell>
    </Row>
  );
}
