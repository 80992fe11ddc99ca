'use client';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { PieceCounter } from '@/components/ui/piece-counter';
import { momentWords, type Clock } from '@/lib/day-words';
import type { markDone, PortalBatch, PortalLine, shipBatch } from '@/lib/portal/contract';
import type { InputOf } from '@/lib/api/endpoint';

import { AnswerState } from './answer-state';
import { Step } from './step';
import type { useAnswer } from './use-answer';

/** What is shipped: everything that is here, or some of it, line by line. */
export interface Shipping {
  note: string;
  /** Null: all. */
  lines: Readonly<Record<string, string>> | null;
}

interface ShipStepProps {
  batch: PortalBatch;
  clock: Clock;
  shipping: Shipping;
  onShipping: (shipping: Shipping) => void;
  ship: ReturnType<typeof useAnswer<typeof shipBatch>>;
  done: ReturnType<typeof useAnswer<typeof markDone>>;
}

/** Done, then on the way back. The two buttons stand in the bar. */
export function ShipStep({ batch, clock, shipping, onShipping, ship, done }: ShipStepProps) {
  const here = hereOf(batch);
  const gone = batch.lines.reduce((sum, line) => sum + line.onTheWayBack, 0);
  const isShipped = batch.shippedAt !== null && here === 0;
  return (
    <Step
      number={4}
      state={isShipped ? 'done' : 'open'}
      title={titleOf(batch, here)}
      aside={asideOf(batch, clock)}
    >
      {batch.shippedNote && <p className="pb-2 [overflow-wrap:anywhere] text-quiet">{batch.shippedNote}</p>}
      {gone > 0 && (
        <p className="pb-2">
          <strong className="num">{gone.toLocaleString('en-US')}</strong> on the way back, not yet counted in
          by the shop.
        </p>
      )}
      {batch.piecesBack > 0 && (
        <p className="pb-2">
          <strong className="num">{batch.piecesBack.toLocaleString('en-US')}</strong> of{' '}
          <span className="num">{batch.pieces.toLocaleString('en-US')}</span> counted in by the shop.
        </p>
      )}
      {batch.markedDoneAt !== null && here > 0 && (
        <HowShipped batch={batch} shipping={shipping} onShipping={onShipping} />
      )}
      {batch.markedDoneAt !== null && batch.shippedAt === null && (
        <Button look="word" className="pt-2" onClick={() => done.give({ batchId: batch.id, done: false })}>
          They are not done after all
        </Button>
      )}
      <AnswerState answer={done} what="Your answer" />
      <AnswerState answer={ship} what="Your answer" />
    </Step>
  );
}

export const hereOf = ({ lines }: PortalBatch): number => lines.reduce((sum, line) => sum + line.here, 0);

function titleOf(batch: PortalBatch, here: number): string {
  if (batch.shippedAt !== null && here === 0) return 'Shipped';
  if (batch.markedDoneAt !== null)
    return batch.shippedAt === null
      ? 'Done, ready to ship'
      : `${here.toLocaleString('en-US')} still with you`;
  return 'Say when they are done and shipped';
}

function asideOf({ shippedAt, markedDoneAt }: PortalBatch, clock: Clock): string | null {
  const at = shippedAt ?? markedDoneAt;
  return at === null ? null : momentWords(new Date(at), clock);
}

function HowShipped({
  batch,
  shipping,
  onShipping,
}: Pick<ShipStepProps, 'batch' | 'shipping' | 'onShipping'>) {
  const lines = batch.lines.filter((line) => line.here > 0);
  return (
    <div className="flex flex-col gap-3">
      <TextField
        label="How they go"
        hint="Carrier and number, or who brings them. May be left empty."
        value={shipping.note}
        maxLength={300}
        onChange={(event) => onShipping({ ...shipping, note: event.currentTarget.value })}
      />
      {shipping.lines === null ? (
        // Which named pieces go in a part shipment is settled by counting them in, so they go whole here.
        lines.every((line) => line.serials.length === 0) && (
          <Button look="word" className="self-start" onClick={() => onShipping({ ...shipping, lines: {} })}>
            Only some of them go now
          </Button>
        )
      ) : (
        <div role="group" aria-label="How many of each line go" className="flex flex-col gap-3">
          {lines.map((line) => (
            <LineShipped
              key={line.id}
              line={line}
              typed={shipping.lines?.[line.id]}
              onType={(typed) => onShipping({ ...shipping, lines: { ...shipping.lines, [line.id]: typed } })}
            />
          ))}
          <Button look="word" className="self-start" onClick={() => onShipping({ ...shipping, lines: null })}>
            All of them go
          </Button>
        </div>
      )}
    </div>
  );
}

function LineShipped({
  line,
  typed,
  onType,
}: {
  line: PortalLine;
  typed: string | undefined;
  onType: (typed: string) => void;
}) {
  return (
    <PieceCounter
      label={
        <>
          Line {line.lineNo}, <span className="num">{line.part}</span>, of {line.here}
        </>
      }
      max={line.here}
      value={typed ?? String(line.here)}
      onChange={(event) => onType(event.currentTarget.value)}
    />
  );
}

/** What goes, as the server takes it; or what is wrong with it. */
export function shipmentOf(
  batch: PortalBatch,
  { note, lines }: Shipping,
): { total: number; input: InputOf<typeof shipBatch> } | { notYet: string } {
  const base = { batchId: batch.id, note };
  if (lines === null) return { total: hereOf(batch), input: base };
  const counts = batch.lines
    .filter((line) => line.here > 0)
    .map((line) => ({ line, typed: lines[line.id] ?? String(line.here) }));
  const wrong = counts.find(
    ({ line, typed }) => !/^\d{1,7}$/.test(typed.trim()) || Number(typed) > line.here,
  );
  if (wrong)
    return { notYet: `Line ${wrong.line.lineNo}: enter a whole number, ${wrong.line.here} or less.` };
  const total = counts.reduce((sum, { typed }) => sum + Number(typed), 0);
  if (total === 0) return { notYet: 'Count at least 1 piece that goes.' };
  return {
    total,
    input: { ...base, counts: counts.map(({ line, typed }) => ({ lineId: line.id, pieces: Number(typed) })) },
  };
}
