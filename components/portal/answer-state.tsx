import { Button } from '@/components/ui/button';
import { Edge } from '@/components/ui/edge';
import { Failing } from '@/components/ui/failing';
import type { ApiError } from '@/lib/api/client';
import { KEPT_DAYS } from './use-kept';

interface AnswerStateProps {
  answer: { waiting: boolean; refusal: ApiError | null; forget: () => void };
  /** "Your count", "The new day". */
  what: string;
}

/** What became of an answer that did not get through: kept here, or refused and why. */
export function AnswerState({ answer: { waiting, refusal, forget }, what }: AnswerStateProps) {
  if (waiting) {
    return (
      <Edge level="warn">
        <div role="status">
          <strong>No network.</strong> {what} is kept on this phone for {KEPT_DAYS} days and is sent when the
          network is back.
        </div>
        <Button look="word" onClick={forget}>
          Do not send it
        </Button>
      </Edge>
    );
  }
  if (!refusal) return null;
  return <Failing says={refusal.problem.title} />;
}
