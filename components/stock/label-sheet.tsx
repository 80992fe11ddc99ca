import { ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import type { Clock } from '@/lib/day-words';
import type { Release } from '@/lib/stock/contract';

import { Label, type LabelCode } from './label';
import { PrintButton } from './print-button';

interface LabelSheetProps {
  batchId: string;
  /** Where only some of the batch's labels are asked for: how many there are in all. */
  ofAll: number;
  labels: readonly { release: Release; code: LabelCode }[];
  shop: string;
  clock: Clock;
}

/** The labels of a batch's releases as they will be printed, one a page. */
export function LabelSheet({ batchId, ofAll, labels, shop, clock }: LabelSheetProps) {
  const count = labels.length;
  return (
    <>
      <div className="no-print">
        <PageHead
          title={count === 1 ? '1 label' : `${count} labels`}
          sub="100 × 60 mm, one a page. Choose the label printer, scale 100 %, no margins."
          actions={
            <>
              {count < ofAll && (
                <ButtonLink href={`/batches/${batchId}/labels`}>All {ofAll} labels</ButtonLink>
              )}
              <ButtonLink href={`/batches/${batchId}/release`}>To the gate</ButtonLink>
              {count > 0 && <PrintButton says={count === 1 ? 'Print the label' : `Print ${count} labels`} />}
            </>
          }
        />
      </div>
      {count === 0 && (
        <Empty
          says="No labels yet."
          comes="Each release of pieces has one."
          action={
            <ButtonLink look="word" href={`/batches/${batchId}/release`}>
              To the gate
            </ButtonLink>
          }
        />
      )}
      <div className="lw-labels">
        {labels.map(({ release, code }) => (
          <Label key={release.id} release={release} code={code} shop={shop} clock={clock} />
        ))}
      </div>
    </>
  );
}
