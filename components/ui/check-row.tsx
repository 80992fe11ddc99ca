import type { ReactNode } from 'react';
import { type CheckLevel, CheckMark, VerdictMark } from './marks';

interface CheckRowProps {
  level: CheckLevel;
  /** What it is, in the words of the trade: "Line 5 ends in T3." */
  sentence: ReactNode;
  rest?: ReactNode;
  source?: ReactNode;
  /** Text buttons: what can be done about it. */
  waysOut?: ReactNode;
}

const HEARD: Record<CheckLevel, string> = { stop: 'stops it', warn: 'warns', note: 'note' };

export function CheckRow({ level, sentence, rest, source, waysOut }: CheckRowProps) {
  return (
    <li className="grid grid-cols-[22px_1fr] gap-x-2 border-b border-rule py-[7px] text-second">
      <CheckMark level={level} />
      <div>
        <span className="sr-only">{HEARD[level]}: </span>
        <strong>{sentence}</strong> {rest}
        {source && <div className="text-source text-faint">{source}</div>}
        {waysOut && (
          <div className="mt-1 flex flex-wrap items-baseline gap-x-4 gap-y-1 touch:gap-y-2">{waysOut}</div>
        )}
      </div>
    </li>
  );
}

export function CheckList({ label, children }: { label: string; children: ReactNode }) {
  return <ul aria-label={label}>{children}</ul>;
}

interface MetChecksProps {
  count: number;
  /** Nothing was found beside them. */
  alone?: boolean;
  children: ReactNode;
}

/** All that is met, in one line that opens. */
export function MetChecks({ count, alone = false, children }: MetChecksProps) {
  return (
    <details className="py-2 pl-[30px] text-second">
      <summary className="flex items-center gap-1.5 font-cond text-word text-proved-ink">
        <VerdictMark verdict="meets" size={13} />
        {count} {alone ? '' : 'other '}
        {count === 1 ? 'check' : 'checks'} met
        <span className="lw-word-button text-ink">Show</span>
      </summary>
      <div className="pt-1">{children}</div>
    </details>
  );
}
