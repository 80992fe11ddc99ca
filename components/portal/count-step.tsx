'use client';
import { CheckboxGroup } from '@/components/ui/choice';
import { PieceCounter } from '@/components/ui/piece-counter';
import type { PortalLine } from '@/lib/portal/contract';
import type { Counting } from '@/lib/portal/count-of';
import { Step } from './step';

interface CountStepProps {
  lines: readonly PortalLine[];
  expected: number;
  counting: Counting;
  onCount: (counting: Counting) => void;
  /** What is not right yet, once a person has changed something. */
  notYet: string | undefined;
}

/** How many came: one number; only where it is not all of them, which line is short. */
export function CountStep({ lines, expected, counting, onCount, notYet }: CountStepProps) {
  const all = counting.total.trim() === String(expected);
  const onTheWay = lines.filter((line) => line.onTheWay > 0);
  const asksWhich =
    !all &&
    Number(counting.total) < expected &&
    Number(counting.total) > 0 &&
    (onTheWay.length > 1 || onTheWay.some((line) => line.serials.length > 0));
  return (
    <Step number={1} title="How many pieces do you have?">
      <PieceCounter
        label={<span className="sr-only">Pieces you have</span>}
        value={counting.total}
        max={expected}
        onChange={(event) => onCount({ ...counting, total: event.currentTarget.value })}
        error={all || asksWhich ? undefined : notYet}
      />
      <p className="pt-1 text-second text-quiet">
        The traveller says <strong className="num">{expected.toLocaleString('en-US')}</strong>. Count again if
        you get another number.
      </p>
      {asksWhich && (
        <div role="group" aria-label="Which are missing" className="flex flex-col gap-3 pt-3">
          <strong>Which are missing?</strong>
          {onTheWay.map((line) => (
            <LineCounter key={line.id} line={line} counting={counting} onCount={onCount} />
          ))}
          {notYet && <p className="text-second text-quiet">{notYet}</p>}
        </div>
      )}
    </Step>
  );
}

interface LineCounterProps {
  line: PortalLine;
  counting: Counting;
  onCount: (counting: Counting) => void;
}

function LineCounter({ line, counting, onCount }: LineCounterProps) {
  const label = (
    <>
      Line {line.lineNo}, <span className="num">{line.part}</span>, of {line.onTheWay}
    </>
  );
  if (line.serials.length > 0) {
    const there = counting.serials[line.id] ?? line.serials;
    const toggle = (serial: string, isThere: boolean) =>
      onCount({
        ...counting,
        serials: {
          ...counting.serials,
          [line.id]: isThere ? [...there, serial] : there.filter((one) => one !== serial),
        },
      });
    return (
      <CheckboxGroup
        label={label}
        hint="Tick the ones you have."
        options={line.serials.map((serial) => ({
          value: serial,
          says: <span className="num">{serial}</span>,
        }))}
        chosen={[...there]}
        onChange={(event) => toggle(event.currentTarget.value, event.currentTarget.checked)}
      />
    );
  }
  return (
    <PieceCounter
      label={label}
      max={line.onTheWay}
      value={counting.lines[line.id] ?? String(line.onTheWay)}
      onChange={(event) =>
        onCount({ ...counting, lines: { ...counting.lines, [line.id]: event.currentTarget.value } })
      }
    />
  );
}
