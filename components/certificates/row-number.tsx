import type { Verdict } from '@/components/ui/marks';

const GROUNDS: Record<Verdict, string> = {
  meets: 'bg-proved-ink',
  does_not_meet: 'bg-held-ink',
  not_stated: 'bg-dispatched-ink',
  cannot_tell: 'bg-returned-ink',
  to_decide: 'bg-quiet',
};

/** The number of a row in the colour of its verdict, as it stands beside a spot on the page. */
export function RowNumber({ number, verdict }: { number: number; verdict: Verdict }) {
  return (
    <span
      className={`inline-block min-w-[18px] px-[3px] text-center font-mono text-[0.78rem] leading-4 font-semibold text-paper ${GROUNDS[verdict]}`}
    >
      {number}
    </span>
  );
}
