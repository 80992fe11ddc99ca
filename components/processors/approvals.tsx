'use client';
import { useState } from 'react';

import { useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Empty } from '@/components/ui/empty';
import { TextField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { useClock } from '@/components/session/use-me';
import { shortDayWords, type Clock } from '@/lib/day-words';
import { PROCESS_WORDS } from '@/lib/trade/process';
import {
  getProcessor,
  listProcessors,
  withdrawApproval,
  type Approval,
  type Processor,
} from '@/lib/processors/contract';

import { ApprovalForm } from './approval-form';
import { ApprovalEnd } from './processors-screen';

interface ApprovalsProps {
  processor: Processor;
  mayEdit: boolean;
  now: Date;
}

/** What the processor may do for the shop, by paper and day. Dispatch looks here. */
export function Approvals({ processor, mayEdit, now }: ApprovalsProps) {
  const { zone } = useClock();
  const [isAdding, setAdding] = useState(false);
  const [withdrawn, setWithdrawn] = useState<Approval | null>(null);
  const add = mayEdit && !isAdding && (
    <Button look="word" onClick={() => setAdding(true)}>
      Add an approval
    </Button>
  );
  return (
    <Section title="Approvals" action={add}>
      {isAdding && (
        <ApprovalForm
          processorId={processor.processorId}
          today={processor.today}
          done={() => setAdding(false)}
        />
      )}
      {processor.approvals.length === 0 ? (
        <Empty
          says="Not approved for anything."
          comes="Without an approval for the process that holds on the day, a batch does not leave."
        />
      ) : (
        <Table
          label="Approvals"
          columns={[
            { says: 'Approval' },
            { says: 'Processes' },
            { says: 'Specifications' },
            { says: 'From' },
            { says: 'To' },
            { says: 'Action', hidden: true, right: true },
          ]}
        >
          {processor.approvals.map((approval) => (
            <ApprovalRow
              key={approval.id}
              approval={approval}
              clock={{ zone, now }}
              withdraw={mayEdit ? () => setWithdrawn(approval) : null}
            />
          ))}
        </Table>
      )}
      {withdrawn && (
        <WithdrawDialog processor={processor} approval={withdrawn} close={() => setWithdrawn(null)} />
      )}
    </Section>
  );
}

const STATE_WORDS: Record<Approval['state'], string> = {
  holds: '',
  begins_later: 'begins later',
  ended: 'has ended',
  withdrawn: 'withdrawn',
};

function ApprovalRow({
  approval,
  clock,
  withdraw,
}: {
  approval: Approval;
  clock: Clock;
  withdraw: (() => void) | null;
}) {
  const isOver = approval.state === 'ended' || approval.state === 'withdrawn';
  return (
    <Row state={isOver ? 'off' : 'rest'}>
      <Cell code head="Approval">
        {approval.reference} <span className="font-sans text-quiet">{STATE_WORDS[approval.state]}</span>
      </Cell>
      <Cell head="Processes">{approval.processes.map((process) => PROCESS_WORDS[process]).join(', ')}</Cell>
      <Cell head="Specifications">
        {approval.specifications.length === 0 ? (
          <span className="text-quiet">any for these processes</span>
        ) : (
          approval.specifications.join(', ')
        )}
      </Cell>
      <Cell head="From" className="whitespace-nowrap">
        {shortDayWords(approval.validFrom, clock)}
      </Cell>
      <Cell head="To" className="whitespace-nowrap">
        <ApprovalEnd day={approval.validTo} clock={clock} />
      </Cell>
      <Cell right>
        {withdraw !== null && !isOver && (
          <Button look="word" onClick={withdraw}>
            Withdraw
            <span className="sr-only"> {approval.reference}</span>
          </Button>
        )}
      </Cell>
    </Row>
  );
}

function WithdrawDialog({
  processor,
  approval,
  close,
}: {
  processor: Processor;
  approval: Approval;
  close: () => void;
}) {
  const write = useWrite(withdrawApproval, { refreshes: [getProcessor, listProcessors] });
  const [reason, setReason] = useState('');
  const done = () => {
    showMessage({ says: `Approval ${approval.reference} is withdrawn.` });
    close();
  };
  const withdraw = () =>
    write.mutate(
      { processorId: processor.processorId, approvalId: approval.id, reason },
      { onSuccess: done },
    );
  return (
    <Dialog
      open
      onClose={close}
      busy={write.isPending}
      title={`Withdraw approval ${approval.reference}`}
      lead={`From now on nothing leaves to ${processor.name} under it. What was dispatched stays as it is.`}
      onSubmit={withdraw}
      actions={
        <>
          <Button type="submit" look="stop" busy={write.isPending} busyLabel="Withdrawing">
            Withdraw the approval
          </Button>
          <Button onClick={close}>Leave it</Button>
        </>
      }
    >
      <TextField
        label="Reason"
        value={reason}
        onChange={(event) => setReason(event.currentTarget.value)}
        error={
          write.error?.problem.fields?.find(({ field }) => field === 'reason')?.message ??
          write.error?.message
        }
        autoFocus
      />
    </Dialog>
  );
}
