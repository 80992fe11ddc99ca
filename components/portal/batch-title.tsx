import { BatchTag } from '@/components/ui/tag';
import { dayWords, type Clock } from '@/lib/day-words';
import type { PortalBatch } from '@/lib/portal/contract';

/** What it is, in one sentence. */
export function BatchTitle({ batch, clock }: { batch: PortalBatch; clock: Clock }) {
  const { number, stage, asked, specification, orderNumber, processor, wantedBackOn } = batch;
  return (
    <div className="pb-2.5">
      <BatchTag size="phone" stage={stage} number={number} />
      <h1 className="pt-2.5 text-[1.4375rem] leading-[1.6875rem] text-balance [overflow-wrap:anywhere]">
        {whatWords(batch)}: {asked}
      </h1>
      <p className="pt-0.5 [overflow-wrap:anywhere] text-quiet">
        {specification}. Order <span className="num">{orderNumber}</span>. For you,{' '}
        <strong>{processor}</strong>.
        {wantedBackOn !== null && <> Wanted back by {dayWords(wantedBackOn, clock)}.</>}
      </p>
    </div>
  );
}

/** `41 pc Chine angle`, `41 pc of 3 parts` */
function whatWords({ pieces, lines }: PortalBatch): string {
  const names = new Set(lines.map((line) => line.name));
  const [only = ''] = names;
  return `${pieces.toLocaleString('en-US')} pc ${names.size === 1 ? only : `of ${names.size} parts`}`;
}
