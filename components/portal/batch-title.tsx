import { BatchTag } from '@/components/ui/tag';
import { dayWords, type Clock } from '@/lib/day-words';
import { contentsWords } from '@/lib/parts/contents-words';
import type { PortalBatch } from '@/lib/portal/contract';

/** What it is, in one sentence. */
export function BatchTitle({ batch, clock }: { batch: PortalBatch; clock: Clock }) {
  const { number, stage, pieces, lines, asked, specification, orderNumber, processor, wantedBackOn } = batch;
  return (
    <div className="pb-2.5">
      <BatchTag size="phone" stage={stage} number={number} />
      <h1 className="pt-2.5 text-[1.4375rem] leading-[1.6875rem] text-balance [overflow-wrap:anywhere]">
        {contentsWords(pieces, [...new Set(lines.map((line) => line.name))])}: {asked}
      </h1>
      <p className="pt-0.5 [overflow-wrap:anywhere] text-quiet">
        {specification}. Order <span className="num">{orderNumber}</span>. For you,{' '}
        <strong>{processor}</strong>.
        {wantedBackOn !== null && <> Wanted back by {dayWords(wantedBackOn, clock)}.</>}
      </p>
    </div>
  );
}
