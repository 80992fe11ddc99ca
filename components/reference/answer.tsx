import type { ReactNode } from 'react';

import { VerdictMark } from '@/components/ui/marks';

interface AnswerProps {
  /** Null where it is neither good nor bad, only a figure. */
  good: boolean | null;
  /** The answer in a few large words. */
  says: ReactNode;
  rest?: ReactNode;
}

/** What comes out, said before it is drawn; read aloud when it changes. */
export function Answer({ good, says, rest }: AnswerProps) {
  return (
    <div className="flex flex-wrap items-baseline gap-x-4 gap-y-1 py-2.5" aria-live="polite">
      {good !== null && (
        <VerdictMark
          verdict={good ? 'meets' : 'does_not_meet'}
          size={15}
          className={good ? 'text-proved-ink' : 'text-held-ink'}
        />
      )}
      <strong className="text-[1.3125rem] leading-[1.625rem]">{says}</strong>
      {rest && <span className="text-second">{rest}</span>}
    </div>
  );
}

/** Why there is no answer: what is, then what to do. Never a guess beside it. */
export function NoAnswer({ says }: { says: string }) {
  return (
    <p className="my-2.5 border-l-4 border-dispatched py-[3px] pl-3" aria-live="polite">
      {says}
    </p>
  );
}
