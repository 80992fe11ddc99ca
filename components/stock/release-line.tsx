'use client';
import Link from 'next/link';
import { useFormContext } from 'react-hook-form';

import { Button, ButtonLink } from '@/components/ui/button';
import { CheckList, CheckRow } from '@/components/ui/check-row';
import { CheckboxGroup } from '@/components/ui/choice';
import { SelectField } from '@/components/ui/field';
import { VerdictMark } from '@/components/ui/marks';
import { PieceCounter } from '@/components/ui/piece-counter';
import { PROCESS_WORDS } from '@/lib/trade/process';
import type { GateLine, Location } from '@/lib/stock/contract';

import { missingWords } from './missing-words';
import type { ReleaseFormIn, ReleaseFormOut } from './release-form';

interface ReleaseLineProps {
  line: GateLine;
  at: number;
  batch: { batchId: string; processor: string };
  locations: readonly Location[];
  mayRelease: boolean;
}

/** One line at the gate: what may pass and why the rest may not, and beside it how many go where. */
export function ReleaseLine({ line, at, batch, locations, mayRelease }: ReleaseLineProps) {
  const titleId = `line-${line.lineId}`;
  const missing = missingWords(line, batch);
  return (
    <section
      aria-labelledby={titleId}
      className="grid grid-cols-1 gap-x-gutter gap-y-3 border-t border-rule pt-2.5 pb-4 lg:grid-cols-[minmax(0,1fr)_26rem]"
    >
      <div className="min-w-0">
        <div className="flex flex-wrap items-baseline gap-x-3 gap-y-0.5">
          <h3 id={titleId} className="text-section">
            <span className="num pr-2 text-quiet">{line.lineNo}</span>
            <span className="num">{line.partNumber}</span> <span className="font-normal">rev</span>{' '}
            {line.partRevision}
          </h3>
          <span className="font-cond">{line.partName}</span>
          <span className="text-quiet">
            lot{' '}
            <Link href={`/lots/${line.lotId}`} className="num font-semibold text-ink">
              {line.lotNumber}
            </Link>
          </span>
          <span className="ml-auto text-quiet">
            <span className="num">{line.pieces}</span> ordered
            {line.released > 0 && (
              <>
                , <span className="num">{line.released}</span> released before
              </>
            )}
          </span>
        </div>
        <p
          className={`flex items-center gap-2 pt-1.5 font-cond text-word ${line.mayPass > 0 ? 'text-proved-ink' : 'text-quiet'}`}
        >
          {line.mayPass > 0 && <VerdictMark verdict="meets" size={13} />}
          {passWords(line)}
        </p>
        {missing.length > 0 && (
          <CheckList label={`What line ${line.lineNo} still misses`}>
            {missing.map(({ reason, level, sentence, rest, waysOut }) => (
              <CheckRow
                key={reason}
                level={level}
                sentence={sentence}
                rest={rest}
                waysOut={waysOut.map(({ says, href }) => (
                  <ButtonLink key={href} look="word" href={href}>
                    {says}
                  </ButtonLink>
                ))}
              />
            ))}
          </CheckList>
        )}
      </div>
      {mayRelease && line.mayPass > 0 && <Choice line={line} at={at} locations={locations} />}
    </section>
  );
}

function passWords(line: GateLine): string {
  if (line.mayPass > 0)
    return `${line.mayPass} may pass${line.nextProcess ? `, on to ${PROCESS_WORDS[line.nextProcess]}` : ''}`;
  return line.released >= line.pieces ? 'All of it has passed' : 'Nothing of it may pass now';
}

function Choice({ line, at, locations }: Pick<ReleaseLineProps, 'line' | 'at' | 'locations'>) {
  const { register, setValue, formState } = useFormContext<ReleaseFormIn, unknown, ReleaseFormOut>();
  const errors = formState.errors.lines?.[at];
  const open = locations.filter((place) => !place.closed);
  return (
    <div className="flex min-w-0 flex-col gap-2.5">
      <div className="grid grid-cols-1 gap-x-4 gap-y-2.5 sm:grid-cols-2">
        {line.named.length > 0 ? (
          <CheckboxGroup
            label={`Pieces of line ${line.lineNo}`}
            hint={
              line.named.length > line.mayPass
                ? `${line.mayPass} of these ${line.named.length} may pass: choose those the papers name`
                : undefined
            }
            error={errors?.pieces?.message}
            options={line.named.map((piece) => ({
              value: piece.id,
              says: <span className="num">{piece.serial}</span>,
            }))}
            {...register(`lines.${at}.names`)}
          />
        ) : (
          <PieceCounter
            {...register(`lines.${at}.pieces`)}
            label={`Pieces of line ${line.lineNo}`}
            min={0}
            max={line.mayPass}
            error={errors?.pieces?.message}
          />
        )}
        {line.nextProcess ? (
          <p className="self-center">
            Goes on to: <strong>{PROCESS_WORDS[line.nextProcess]}</strong>
          </p>
        ) : (
          <SelectField
            label={`Place of line ${line.lineNo}`}
            empty="Choose a place"
            error={errors?.locationId?.message}
            options={open.map(({ id, name }) => ({ value: id, says: name }))}
            {...register(`lines.${at}.locationId`)}
          />
        )}
      </div>
      {line.named.length === 0 && (
        <div className="flex gap-4">
          <Button
            look="word"
            onClick={() => setValue(`lines.${at}.pieces`, String(line.mayPass), { shouldValidate: true })}
          >
            All {line.mayPass}
          </Button>
          <Button look="word" onClick={() => setValue(`lines.${at}.pieces`, '0', { shouldValidate: true })}>
            None
          </Button>
        </div>
      )}
    </div>
  );
}
