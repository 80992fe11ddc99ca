'use client';
import { useState } from 'react';

import { Button } from '@/components/ui/button';
import { DateField } from '@/components/ui/field';
import { calendarDay, daysUntil, dayWords, shortDayWords, type Clock } from '@/lib/day-words';
import { promiseDay, type PortalBatch } from '@/lib/portal/contract';

import { AnswerState } from './answer-state';
import { Step } from './step';
import { useAnswer } from './use-answer';

/** What was promised, and a new day where that one does not hold. */
export function PromiseStep({ batch, clock }: { batch: PortalBatch; clock: Clock }) {
  const [day, setDay] = useState('');
  const promise = useAnswer(promiseDay, batch.id, () => setDay(''));
  const away = batch.lines.some((line) => line.onTheWay + line.here + line.onTheWayBack > 0);
  const here = batch.lines.some((line) => line.onTheWay + line.here > 0);
  const late = here && batch.promisedOn !== null && daysUntil(batch.promisedOn, clock) < 0;
  const [latest] = batch.promises;
  return (
    <Step
      number={2}
      state={stateOf({ late, promised: batch.promisedOn !== null })}
      title={<PromiseTitle batch={batch} clock={clock} late={late} />}
      aside={latest && `${shortDayWords(new Date(latest.madeAt), clock)}, ${latest.madeBy}`}
    >
      {away && (
        <form
          noValidate
          className="grid grid-cols-[1fr_8.25rem] items-start gap-2 max-[22rem]:grid-cols-1"
          onSubmit={(event) => {
            event.preventDefault();
            if (day !== '') void promise.give({ batchId: batch.id, promisedOn: day });
          }}
        >
          <DateField
            label={batch.promisedOn === null ? 'The day they will be done' : 'New day'}
            min={calendarDay(clock.now, clock.zone)}
            value={day}
            onChange={(event) => setDay(event.currentTarget.value)}
            hint={day === '' ? undefined : dayWords(day, clock)}
            error={promise.refusal?.problem.fields?.[0]?.message}
          />
          <Button
            type="submit"
            size="big"
            className="mt-6"
            busy={promise.sending}
            busyLabel="Sending"
            notNow={day === '' && 'Choose a day first.'}
            reasonAt="elsewhere"
          >
            Promise
          </Button>
        </form>
      )}
      <AnswerState
        answer={promise.refusal?.problem.fields ? { ...promise, refusal: null } : promise}
        what="The new day"
      />
    </Step>
  );
}

function stateOf({ late, promised }: { late: boolean; promised: boolean }): 'open' | 'done' | 'late' {
  if (late) return 'late';
  return promised ? 'done' : 'open';
}

function PromiseTitle({
  batch: { promisedOn },
  clock,
  late,
}: {
  batch: PortalBatch;
  clock: Clock;
  late: boolean;
}) {
  if (promisedOn === null) return <>No day promised yet</>;
  const days = -daysUntil(promisedOn, clock);
  return (
    <>
      Promised {shortDayWords(promisedOn, clock)}
      {late && (
        <span className="text-held-ink">
          , {days} {days === 1 ? 'day' : 'days'} ago
        </span>
      )}
    </>
  );
}
