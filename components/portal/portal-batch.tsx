'use client';
import { useState } from 'react';

import { useRead } from '@/components/api/use-api';
import { BottomActions } from '@/components/shell/portal-shell';
import { Button } from '@/components/ui/button';
import { Edge } from '@/components/ui/edge';
import { momentWords, shortDayWords, type Clock } from '@/lib/day-words';
import {
  acknowledgeBatch,
  getPortalBatch,
  markDone,
  shipBatch,
  type PortalBatch as Batch,
} from '@/lib/portal/contract';

import { AnswerState } from './answer-state';
import { AskButton } from './ask-button';
import { AskedLines } from './asked-lines';
import { BatchTitle } from './batch-title';
import { FirstAnswer } from './first-answer';
import { PapersStep } from './papers-step';
import { PortalMessages } from './portal-messages';
import { PromiseStep } from './promise-step';
import { hereOf, shipmentOf, ShipStep, type Shipping } from './ship-step';
import { Step } from './step';
import { useAnswer } from './use-answer';

/** The processor's page of one batch: what is asked, then what is to be answered next, which also stands in the bar. */
export function PortalBatch({ batchId, now }: { batchId: string; now: string }) {
  const { data: batch } = useRead(getPortalBatch, { batchId });
  const clock = { zone: batch.shop.zone, now: new Date(now) };
  const isFirst = batch.acknowledgedAt === null && batch.lines.some((line) => line.onTheWay > 0);
  return (
    <>
      <BatchTitle batch={batch} clock={clock} />
      {batch.cancelledAt !== null && <Cancelled batch={batch} clock={clock} />}
      <AskedLines batch={batch} clock={clock} folded={!isFirst && batch.cancelledAt === null} />
      {batch.cancelledAt === null &&
        (isFirst ? <FirstAnswer batch={batch} clock={clock} /> : <UnderWay batch={batch} clock={clock} />)}
      <PortalMessages batchId={batchId} clock={clock} />
    </>
  );
}

function Cancelled({ batch: { shop, cancelledAt }, clock }: { batch: Batch; clock: Clock }) {
  return (
    <Edge level="stop">
      <strong>{shop.name} has cancelled this batch</strong>
      {cancelledAt !== null && `, ${momentWords(new Date(cancelledAt), clock)}`}. Do not work on it; its
      pieces go back as they are.
    </Edge>
  );
}

function UnderWay({ batch, clock }: { batch: Batch; clock: Clock }) {
  const [shipping, setShipping] = useState<Shipping>({ note: '', lines: null });
  const done = useAnswer(markDone, batch.id);
  const ship = useAnswer(shipBatch, batch.id, () => setShipping({ note: '', lines: null }));
  return (
    <>
      <HaveStep batch={batch} clock={clock} />
      <PromiseStep batch={batch} clock={clock} />
      <PapersStep batch={batch} clock={clock} />
      <ShipStep
        batch={batch}
        clock={clock}
        shipping={shipping}
        onShipping={setShipping}
        ship={ship}
        done={done}
      />
      <BottomActions>
        <AskButton />
        <NextAnswer batch={batch} shipping={shipping} ship={ship} done={done} />
      </BottomActions>
    </>
  );
}

function HaveStep({ batch, clock }: { batch: Batch; clock: Clock }) {
  const rest = useAnswer(acknowledgeBatch, batch.id);
  const onTheWay = batch.lines.reduce((sum, line) => sum + line.onTheWay, 0);
  const had = batch.acknowledgedPieces ?? 0;
  return (
    <Step
      number={1}
      state={onTheWay > 0 ? 'late' : 'done'}
      title={
        onTheWay > 0
          ? `You have ${had} of ${batch.pieces} pieces`
          : `${hereOf(batch) > 0 ? 'You have' : 'You had'} ${had || batch.pieces} pieces`
      }
      aside={batch.acknowledgedAt === null ? null : shortDayWords(new Date(batch.acknowledgedAt), clock)}
    >
      {onTheWay > 0 && (
        <>
          <p className="pb-2">
            <strong className="num">{onTheWay}</strong> {onTheWay === 1 ? 'has' : 'have'} not come.{' '}
            {batch.shop.name} is told.
          </p>
          <Button busy={rest.sending} busyLabel="Sending" onClick={() => rest.give({ batchId: batch.id })}>
            {onTheWay === 1 ? 'It has come now' : `The ${onTheWay} have come now`}
          </Button>
          <AnswerState answer={rest} what="Your answer" />
        </>
      )}
    </Step>
  );
}

interface NextAnswerProps {
  batch: Batch;
  shipping: Shipping;
  ship: ReturnType<typeof useAnswer<typeof shipBatch>>;
  done: ReturnType<typeof useAnswer<typeof markDone>>;
}

/** The one thing to say next. */
function NextAnswer({ batch, shipping, ship, done }: NextAnswerProps) {
  const here = hereOf(batch);
  if (here > 0 && batch.markedDoneAt === null) {
    return (
      <Button
        look="primary"
        size="big"
        busy={done.sending}
        busyLabel="Sending"
        notNow={done.waiting && 'It waits for the network.'}
        reasonAt="elsewhere"
        onClick={() => done.give({ batchId: batch.id })}
      >
        {here === 1 ? 'It is done' : `The ${here.toLocaleString('en-US')} are done`}
      </Button>
    );
  }
  if (here > 0) {
    const shipment = shipmentOf(batch, shipping);
    const notNow = 'notYet' in shipment ? shipment.notYet : ship.waiting && 'It waits for the network.';
    return (
      <Button
        look="primary"
        size="big"
        busy={ship.sending}
        busyLabel="Sending"
        notNow={notNow}
        reasonAt="below"
        onClick={() => ('input' in shipment ? ship.give(shipment.input) : undefined)}
      >
        {'total' in shipment ? `${shipment.total.toLocaleString('en-US')} shipped` : 'Shipped'}
      </Button>
    );
  }
  const wanted = (['certificate', 'invoice'] as const).find(
    (kind) =>
      !batch.papers.some((paper) => paper.kind === kind && !['set_aside', 'refused'].includes(paper.state)),
  );
  if (wanted === undefined)
    return <p className="flex items-center text-quiet">Nothing more is wanted from you.</p>;
  return (
    <Button
      look="primary"
      size="big"
      onClick={() => document.getElementById('papers')?.scrollIntoView({ block: 'start' })}
    >
      Send the {wanted}
    </Button>
  );
}
