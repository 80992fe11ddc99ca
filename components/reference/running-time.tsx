import { timeLeft, type TimeLeft } from '@/lib/trade/heat-treat/time-left';

import { countdownWords } from './bench-moment';

interface RunningTimeProps {
  begins: Date;
  ends: Date;
  now: Date;
  /** What it is the time of: "At room temperature". */
  says: string;
}

const LOOKS: Record<TimeLeft['state'], { edge: string; ink: string }> = {
  not_begun: { edge: 'border-rule', ink: 'text-quiet' },
  running: { edge: 'border-proved', ink: '' },
  near_end: { edge: 'border-dispatched', ink: 'text-dispatched-ink' },
  over: { edge: 'border-held', ink: 'text-held-ink' },
};

/** Heard once, when it changes; the seconds are only read when somebody asks for them. */
const HEARD: Record<TimeLeft['state'], string> = {
  not_begun: 'Not begun yet.',
  running: 'Running.',
  near_end: 'Near its end.',
  over: 'It is over: treat it again, or age it as it is.',
};

/** A time that runs out, in large figures. */
export function RunningTime({ begins, ends, now, says }: RunningTimeProps) {
  const { state, leftMs, overMs } = timeLeft({ begins, ends }, now);
  return (
    <div className={`my-2.5 border-l-[6px] py-1 pl-3 ${LOOKS[state].edge}`}>
      <p className="font-cond text-word">{says}</p>
      <p
        role="timer"
        aria-label={`${says}, left`}
        className="font-mono text-[2rem] leading-tight font-semibold tabular-nums"
      >
        {state === 'over' ? `over since ${countdownWords(overMs)}` : countdownWords(leftMs)}
      </p>
      <p aria-live="polite" className={LOOKS[state].ink}>
        {HEARD[state]}
      </p>
    </div>
  );
}
