'use client';
import { useState } from 'react';

import { useRead } from '@/components/api/use-api';
import { useClock, useMay } from '@/components/session/use-me';
import { Button, ButtonLink } from '@/components/ui/button';
import { Day, Moment } from '@/components/ui/day';
import { Edge } from '@/components/ui/edge';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { TitleCells } from '@/components/ui/title-cells';
import { BatchTag } from '@/components/ui/tag';
import { getBatchChecks } from '@/lib/batches/check-contract';
import { getBatch, putBatchAside, type Batch } from '@/lib/batches/contract';
import { calendarDay } from '@/lib/day-words';
import { PROCESS_WORDS } from '@/lib/trade/process';

import { CancelDialog } from './cancel-dialog';
import { DispatchDialog } from './dispatch-dialog';
import { useBatchWrite } from './use-batch-write';

/** The batch as its title block, and what can be done with the whole of it now. */
export function BatchHead({ batchId }: { batchId: string }) {
  const { data: batch } = useRead(getBatch, { batchId });
  return (
    <>
      <PageHead
        tag={
          <h1 className="text-body">
            <BatchTag size="head" stage={batch.stage} number={batch.number} daysLate={batch.daysLate} />
          </h1>
        }
        cells={<HeadCells batch={batch} />}
        actions={<Actions batch={batch} />}
      />
      {batch.cancelledAt && (
        <Edge level="note">
          <strong>Cancelled.</strong> {batch.cancelReason} Its pieces wait for the step again.
        </Edge>
      )}
      {batch.putAsideAt && !batch.dispatchedAt && !batch.cancelledAt && (
        <Edge level="note">
          <strong>Put aside.</strong> Its pieces stay reserved.
        </Edge>
      )}
    </>
  );
}

function HeadCells({ batch }: { batch: Batch }) {
  const clock = useClock();
  const left =
    batch.dispatchedAt === null
      ? {
          caption: 'Leaves',
          value: batch.leavesOn ? (
            <Day day={batch.leavesOn} clock={clock} />
          ) : (
            <span className="text-quiet">no day</span>
          ),
        }
      : {
          caption: 'Left',
          value: <Day day={calendarDay(new Date(batch.dispatchedAt), clock.zone)} clock={clock} />,
        };
  return (
    <TitleCells
      cells={[
        { caption: 'To', value: batch.processor },
        { caption: 'Step', value: PROCESS_WORDS[batch.process] },
        { caption: 'Specification', value: batch.specification },
        { caption: 'Order', value: <span className="num">{batch.orderNumber}</span> },
        left,
        {
          caption: 'Wanted back',
          value: batch.wantedBackOn ? (
            <Day day={batch.wantedBackOn} clock={clock} />
          ) : (
            <span className="text-quiet">no day</span>
          ),
        },
        ...(batch.promisedOn ? [{ caption: 'Promised', value: <Promised batch={batch} /> }] : []),
      ]}
    />
  );
}

function Promised({ batch }: { batch: Batch }) {
  const clock = useClock();
  if (!batch.promisedOn) return null;
  return (
    <>
      <Day day={batch.promisedOn} clock={clock} />
      {batch.daysLate > 0 && <strong className="text-held-ink"> {batch.daysLate} d late</strong>}
    </>
  );
}

function Actions({ batch }: { batch: Batch }) {
  const [open, setOpen] = useState<'dispatch' | 'cancel' | null>(null);
  const [mayBuild, mayDispatch] = [useMay('batch.build'), useMay('batch.dispatch')];
  const aside = useBatchWrite(putBatchAside);
  if (batch.cancelledAt !== null) return null;
  const isHere = batch.dispatchedAt === null;
  const putAside = async () => {
    const done = await aside.run({
      batchId: batch.id,
      version: batch.version,
      aside: batch.putAsideAt === null,
    });
    if (done)
      showMessage({
        says: batch.putAsideAt === null ? `${batch.number} is put aside.` : `${batch.number} is taken up.`,
      });
  };
  const mayCancel = mayDispatch && batch.piecesBack === 0;
  const mayReissue = mayDispatch && !isHere && batch.stage !== 'settled' && batch.stage !== 'stocked';
  return (
    <>
      {mayCancel && (
        <Button look="word" onClick={() => setOpen('cancel')}>
          Cancel it
        </Button>
      )}
      {isHere && mayBuild && (
        <Button onClick={putAside}>{batch.putAsideAt === null ? 'Put aside' : 'Take it up'}</Button>
      )}
      {mayReissue && <ButtonLink href={`/batches/${batch.id}/reissue`}>Re-issue</ButtonLink>}
      {isHere && mayDispatch && <Dispatch batch={batch} press={() => setOpen('dispatch')} />}
      {isHere && <DispatchDialog batch={batch} open={open === 'dispatch'} onClose={() => setOpen(null)} />}
      <CancelDialog batch={batch} open={open === 'cancel'} onClose={() => setOpen(null)} />
    </>
  );
}

function Dispatch({ batch, press }: { batch: Batch; press: () => void }) {
  const { data } = useRead(getBatchChecks, { batchId: batch.id });
  const stops = data.findings.filter((finding) => finding.level === 'stop' && finding.passed === null).length;
  return (
    <Button
      look="primary"
      onClick={press}
      notNow={stops > 0 && `${stops} ${stops === 1 ? 'thing stops' : 'things stop'} it`}
    >
      Dispatch
    </Button>
  );
}

/** How far it came, for a batch that has left. */
export function HowItStands({ batchId }: { batchId: string }) {
  const { data: batch } = useRead(getBatch, { batchId });
  const clock = useClock();
  const steps = [
    ...(batch.dispatchedAt
      ? [{ at: batch.dispatchedAt, says: `dispatched by ${batch.dispatchedBy ?? 'someone who has left'}` }]
      : []),
    ...(batch.acknowledgedAt
      ? [
          {
            at: batch.acknowledgedAt,
            says: `${batch.processor} has ${batch.acknowledgedPieces ?? batch.pieces} of ${batch.pieces} pieces`,
          },
        ]
      : []),
    ...(batch.markedDoneAt ? [{ at: batch.markedDoneAt, says: `${batch.processor} says it is done` }] : []),
    ...(batch.shippedAt
      ? [{ at: batch.shippedAt, says: `shipped back${batch.shippedNote ? `: ${batch.shippedNote}` : ''}` }]
      : []),
    ...(batch.lastBackAt
      ? [{ at: batch.lastBackAt, says: `${batch.piecesBack} of ${batch.pieces} pieces counted in` }]
      : []),
    ...(batch.paymentWaivedAt
      ? [{ at: batch.paymentWaivedAt, says: `payment waived: ${batch.paymentWaivedReason ?? ''}` }]
      : []),
  ];
  return (
    <ol aria-label="How far it came" className="border-t-heavy border-ink">
      {steps.map((step) => (
        <li key={step.says} className="flex flex-wrap gap-x-4 border-b border-rule py-[7px] text-second">
          <span className="text-quiet">
            <Moment at={new Date(step.at)} clock={clock} />
          </span>
          <span>{step.says}</span>
        </li>
      ))}
    </ol>
  );
}
