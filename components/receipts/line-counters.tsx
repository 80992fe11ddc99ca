'use client';
import { useFormContext, useWatch } from 'react-hook-form';

import { AsQuenchedNote } from '@/components/reference/as-quenched-note';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { PieceCounter } from '@/components/ui/piece-counter';
import { Pieces } from '@/components/ui/pieces';
import type { ReceivingLine } from '@/lib/receipts/contract';

import type { CountFormIn, CountFormOut } from './count-form';
import { SerialCounts } from './serial-counts';

const COUNTS = [
  { name: 'good', label: 'Good' },
  { name: 'damaged', label: 'Damaged' },
  { name: 'short', label: 'Short' },
  { name: 'over', label: 'Over' },
] as const;

/** One line with its four counters. What is not counted stays away and can come another day. */
export function LineCounters({ line, at }: { line: ReceivingLine; at: number }) {
  const form = useFormContext<CountFormIn, unknown, CountFormOut>();
  const errors = form.formState.errors.lines?.[at];
  const count = useWatch({ control: form.control, name: `lines.${at}` });
  const asksNote =
    [count.damaged, count.short, count.over].some((typed) => typed !== '0' && typed !== '') ||
    Object.values(count.named).includes('damaged');
  const titleId = `line-${line.id}`;
  const allGood = () => {
    form.setValue(`lines.${at}.good`, String(line.away), { shouldDirty: true });
    for (const name of ['damaged', 'short', 'over'] as const) form.setValue(`lines.${at}.${name}`, '0');
  };
  return (
    <section aria-labelledby={titleId} className="border-t-heavy border-ink pt-2 pb-5">
      <div className="flex flex-wrap items-baseline gap-x-4 gap-y-1 pb-2">
        <h2 id={titleId} className="text-section">
          <span className="num">{line.lineNo}</span> {line.partNumber} rev {line.partRevision}
        </h2>
        <span className="text-quiet">
          {line.partName}, lot <span className="num">{line.lotNumber}</span>
        </span>
        <span className="ml-auto">
          <strong>
            <Pieces count={line.away} of={line.pieces} /> away
          </strong>
          {line.shortOpen > 0 && <span className="text-held-ink">, {line.shortOpen} reported short</span>}
        </span>
      </div>
      <AsQuenchedNote alloy={line.alloy} condition={line.targetCondition} />
      {line.serialised ? (
        <SerialCounts line={line} at={at} />
      ) : (
        line.away > 0 && (
          <Button size="small" onClick={allGood}>
            {line.away === 1 ? 'It is here and good' : `All ${line.away} are here and good`}
          </Button>
        )
      )}
      <div className="grid max-w-[59rem] grid-cols-2 gap-x-4 gap-y-3 pt-3 md:grid-cols-4">
        {COUNTS.filter(({ name }) => !line.serialised || name === 'short' || name === 'over').map(
          ({ name, label }) => (
            <PieceCounter
              key={name}
              {...form.register(`lines.${at}.${name}`)}
              label={label}
              min={0}
              max={1_000_000}
              error={errors?.[name]?.message}
            />
          ),
        )}
      </div>
      {line.serialised && (errors?.good ?? errors?.damaged) && (
        <p role="alert" className="pt-2 font-medium text-held-ink">
          {errors?.good?.message ?? errors?.damaged?.message}
        </p>
      )}
      {asksNote && (
        <div className="max-w-prose pt-3">
          <TextField
            label={`What is wrong with line ${line.lineNo}`}
            hint="Stands on the nonconformance, and in the message about what is over."
            maxLength={500}
            error={errors?.note?.message}
            {...form.register(`lines.${at}.note`)}
          />
        </div>
      )}
    </section>
  );
}
