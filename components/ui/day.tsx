import {
  type CalendarDay,
  type Clock,
  dayWords,
  momentWords,
  shortDayWords,
  untilWords,
} from '@/lib/day-words';

interface DayProps {
  day: CalendarDay;
  clock: Clock;
  /** `16 Apr`, for columns. */
  short?: boolean;
}

/** `Thu 16 Apr` */
export function Day({ day, clock, short = false }: DayProps) {
  return <time dateTime={day}>{short ? shortDayWords(day, clock) : dayWords(day, clock)}</time>;
}

/**
 * `Wed 15 Apr 16:40`, in mono because moments stand in columns. A server and a browser may carry the rules of a zone
 * from different years and be an hour apart; what the server drew then stands, and nothing is drawn anew.
 */
export function Moment({ at, clock }: { at: Date; clock: Clock }) {
  return (
    <time dateTime={at.toISOString()} className="num whitespace-nowrap" suppressHydrationWarning>
      {momentWords(at, clock)}
    </time>
  );
}

/** `6 d late` in red oxide, `in 5 d`, `today`. */
export function Until({ day, clock }: { day: CalendarDay; clock: Clock }) {
  const words = untilWords(day, clock);
  return <strong className={`font-cond ${words.endsWith('late') ? 'text-held-ink' : ''}`}>{words}</strong>;
}

/** The flag at the line of today. */
export function LateFlag({ days }: { days: number }) {
  return <span className="lw-flag">{days} d late</span>;
}
