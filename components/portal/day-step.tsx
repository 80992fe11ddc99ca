'use client';
import { DateField } from '@/components/ui/field';
import { calendarDay, dayWords, type CalendarDay, type Clock } from '@/lib/day-words';
import { dayChoices } from '@/lib/portal/day-choices';

/** A day, `other` while one is being chosen, or null for "cannot say yet". */
export interface DayAnswer {
  day: CalendarDay | null;
  other: boolean;
}

interface DayChoiceProps {
  wantedBackOn: string | null;
  clock: Clock;
  answer: DayAnswer;
  onAnswer: (answer: DayAnswer) => void;
  error?: string | undefined;
}

/** When it will be done: mostly one press. */
export function DayChoiceButtons({ wantedBackOn, clock, answer, onAnswer, error }: DayChoiceProps) {
  const choices = dayChoices(wantedBackOn, clock);
  const box = (chosen: boolean) =>
    `lw-btn min-h-[3.25rem] flex-col gap-0.5 px-1 ${chosen ? 'bg-ink text-paper hover:bg-ink' : ''}`;
  return (
    <>
      <div role="group" aria-label="When will they be done" className="grid grid-cols-3 gap-2">
        {choices.map(({ day, asked }) => (
          <button
            key={day}
            type="button"
            aria-pressed={!answer.other && answer.day === day}
            className={box(!answer.other && answer.day === day)}
            onClick={() => onAnswer({ day, other: false })}
          >
            {dayWords(day, clock)}
            {asked && <span className="font-cond text-caption">asked by the shop</span>}
          </button>
        ))}
        <button
          type="button"
          aria-pressed={answer.other}
          className={box(answer.other)}
          onClick={() => onAnswer({ day: answer.day, other: true })}
        >
          Other day
        </button>
      </div>
      {answer.other && (
        <DateField
          className="pt-3"
          label="The day they will be done"
          min={calendarDay(clock.now, clock.zone)}
          value={answer.day ?? ''}
          onChange={(event) => onAnswer({ day: event.currentTarget.value || null, other: true })}
          hint={answer.day === null ? undefined : dayWords(answer.day, clock)}
          error={error}
        />
      )}
      <button
        type="button"
        className="lw-word-button mt-1"
        aria-pressed={!answer.other && answer.day === null}
        onClick={() => onAnswer({ day: null, other: false })}
      >
        {!answer.other && answer.day === null ? 'No day yet; you can promise one later' : 'Cannot say yet'}
      </button>
    </>
  );
}
