'use client';
import { useState } from 'react';

import { useRead, useWrite } from '@/components/api/use-api';
import { History } from '@/components/audit/history';
import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { MainAndSide, Section } from '@/components/ui/section';
import { TitleCells } from '@/components/ui/title-cells';
import { getProcessor, inviteProcessor, type Processor } from '@/lib/processors/contract';

import { Approvals } from './approvals';
import { ContactForm } from './contact-form';
import { EquipmentSection } from './equipment-section';
import { ProcessorBatches } from './processor-batches';

export function ProcessorScreen({ processorId, now }: { processorId: string; now: Date }) {
  const { data: processor } = useRead(getProcessor, { processorId });
  const mayEdit = useMay('processor.edit');
  return (
    <>
      <PageHead
        title={processor.name}
        sub={processor.active ? undefined : 'No longer used by this shop.'}
        cells={<TitleCells cells={cellsOf(processor)} />}
      />
      <MainAndSide
        main={
          <>
            <Approvals processor={processor} mayEdit={mayEdit} now={now} />
            <EquipmentSection processorId={processorId} mayEdit={mayEdit} />
            <ProcessorBatches processorId={processorId} now={now} />
            <History entity="processor" id={processorId} />
          </>
        }
        side={
          <>
            <Section title="Whom we deal with">
              <Contact key={processor.version} processor={processor} mayEdit={mayEdit} />
            </Section>
            <Section title="Its own account" note="sees the batches of all its customers in one list">
              <OwnAccount processor={processor} mayEdit={mayEdit} />
            </Section>
          </>
        }
      />
    </>
  );
}

function cellsOf({ phone, email, address, zone, payoutsReady }: Processor) {
  return [
    { caption: 'Desk', value: email },
    ...(phone === null
      ? []
      : [{ caption: 'Telephone', value: <a href={`tel:${phone.replaceAll(/[^+\d]/g, '')}`}>{phone}</a> }]),
    ...(address.length === 0 ? [] : [{ caption: 'Address', value: address.join(', ') }]),
    { caption: 'Its time', value: zone.replaceAll('_', ' ') },
    { caption: 'Payments', value: payoutsReady ? 'can be paid here' : 'no account for payments yet' },
  ];
}

function Contact({ processor, mayEdit }: { processor: Processor; mayEdit: boolean }) {
  const [isOpen, setOpen] = useState(false);
  if (isOpen) return <ContactForm processor={processor} done={() => setOpen(false)} />;
  return (
    <div className="flex flex-col gap-1.5 pt-1">
      <p>
        {processor.contactName !== null && <strong>{processor.contactName} </strong>}
        <span className="break-words">{processor.contactEmail}</span>
      </p>
      {processor.note !== null && <p className="whitespace-pre-line text-quiet">{processor.note}</p>}
      {mayEdit && (
        <div>
          <Button look="word" onClick={() => setOpen(true)}>
            Change the contact
          </Button>
        </div>
      )}
    </div>
  );
}

function OwnAccount({ processor, mayEdit }: { processor: Processor; mayEdit: boolean }) {
  const write = useWrite(inviteProcessor);
  const { processorId, email } = processor;
  const invite = () =>
    write.mutate(
      { processorId },
      {
        onSuccess: () => showMessage({ says: `The invitation is on its way to ${email}.` }),
        onError: (error) => showMessage({ says: error.message, failed: true }),
      },
    );
  return (
    <div className="flex flex-col gap-2 pt-1">
      <p className="text-quiet">
        No account is needed to answer: the link in each dispatch mail opens that batch.
      </p>
      {mayEdit && (
        <div>
          <Button size="small" busy={write.isPending} busyLabel="Inviting" onClick={invite}>
            {`Invite ${email}`}
          </Button>
        </div>
      )}
    </div>
  );
}
