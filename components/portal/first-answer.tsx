'use client';
import { useState } from 'react';

import { BottomActions } from '@/components/shell/portal-shell';
import { Button } from '@/components/ui/button';
import { shortDayWords, type Clock } from '@/lib/day-words';
import { acknowledgeBatch, type PortalBatch } from '@/lib/portal/contract';
import { countOf, type Counting } from '@/lib/portal/count-of';
import { dayChoices } from '@/lib/portal/day-choices';

import { AnswerState } from './answer-state';
import { AskButton } from './ask-button';
import { CountStep } from './count-step';
import { DayChoiceButtons, type DayAnswer } from './day-step';
import { Step } from './step';
import { useAnswer } from './use-answer';
import { KEPT_DAYS } from './use-kept';

/** The first visit: "I have 41, done 10 Apr" is one press when all is there and the asked day is good. */
export function FirstAnswer({ batch, clock }: { batch: PortalBatch; clock: Clock }) {
  const expected = batch.lines.reduce((sum, line) => sum + line.onTheWay, 0);
  const [counting, setCounting] = useState<Counting>({ total: String(expected), lines: {}, serials: {} });
  const [answer, setAnswer] = useState<DayAnswer>({
    day: dayChoices(batch.wantedBackOn, clock)[0]?.day ?? null,
    other: false,
  });
  const acknowledge = useAnswer(acknowledgeBatch, batch.id);

  const counted = countOf(counting, batch.lines, expected);
  const dayMissing = answer.other && answer.day === null;
  const notNow =
    ('notYet' in counted && counted.notYet) || (dayMissing && 'Choose the day, or say that you cannot yet.');
  const give = () => {
    if ('notYet' in counted) return;
    return acknowledge.give({
      batchId: batch.id,
      promisedOn: answer.day,
      ...(counted.counts ? { counts: counted.counts } : {}),
    });
  };
  const promisedError = acknowledge.refusal?.problem.fields?.find(
    (one) => one.field === 'promisedOn',
  )?.message;

  return (
    <>
      <CountStep
        lines={batch.lines}
        expected={expected}
        counting={counting}
        onCount={setCounting}
        notYet={'notYet' in counted ? counted.notYet : undefined}
      />
      <Step number={2} title="When will they be done?">
        <DayChoiceButtons
          wantedBackOn={batch.wantedBackOn}
          clock={clock}
          answer={answer}
          onAnswer={setAnswer}
          error={promisedError}
        />
        <p className="pt-1 text-second text-quiet">
          Your answer is kept for {KEPT_DAYS} days on this phone if you have no network.
        </p>
        <AnswerState answer={acknowledge} what="Your answer" />
      </Step>
      <BottomActions>
        <AskButton />
        <Button
          look="primary"
          size="big"
          busy={acknowledge.sending}
          busyLabel="Sending"
          notNow={notNow || (acknowledge.waiting && 'It waits for the network.')}
          reasonAt="elsewhere"
          onClick={give}
        >
          {labelOf('total' in counted ? counted.total : Number(counting.total) || 0, answer.day, clock)}
        </Button>
      </BottomActions>
    </>
  );
}

const labelOf = (total: number, day: string | null, clock: Clock): string =>
  `I have ${total.toLocaleString('en-US')}, ${day === null ? 'no day yet' : `done ${shortDayWords(day, clock)}`}`;
