import { addDays, calendarDay, type CalendarDay, type Clock } from '@/lib/day-words';

export interface DayChoice {
  day: CalendarDay;
  /** It is the day the shop asked for. */
  asked: boolean;
}

/**
 * Two days to choose from with one press: the one the shop asked for and the next working day after it. Where the
 * asked day is past, or none was asked, the next two working days from today.
 *
 * @example Asked Fri 10 Apr, today 26 Mar: Fri 10 Apr (asked), Mon 13 Apr.
 */
export function dayChoices(wantedBackOn: CalendarDay | null, clock: Clock): DayChoice[] {
  const today = calendarDay(clock.now, clock.zone);
  if (wantedBackOn !== null && wantedBackOn >= today) {
    return [
      { day: wantedBackOn, asked: true },
      { day: nextWorkday(wantedBackOn), asked: false },
    ];
  }
  const first = nextWorkday(today);
  return [
    { day: first, asked: false },
    { day: nextWorkday(first), asked: false },
  ];
}

function nextWorkday(day: CalendarDay): CalendarDay {
  const next = addDays(day, 1);
  const weekday = new Date(`${next}T00:00:00Z`).getUTCDay();
  return weekday === 0 || weekday === 6 ? nextWorkday(next) : next;
}
