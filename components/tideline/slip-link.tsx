import Link from 'next/link';

import { BatchTag } from '@/components/ui/tag';
import { STAGE_TONES, STAGE_WORDS } from '@/components/ui/stages';
import type { PlacedSlip } from '@/lib/tideline/lay-out';

/** A thin slip that opens to its tag when it is pointed at or walked to. It carries no word; the list form has everything. */
export function SlipLink({ slip }: { slip: PlacedSlip }) {
  const { batch } = slip;
  return (
    <li>
      <Link
        href={`/batches/${batch.id}`}
        aria-label={`${batch.number}, ${STAGE_WORDS[batch.stage]}, ${batch.contents}`}
        className={`lw-slip group absolute block ${STAGE_TONES[batch.stage]}`}
        style={{ left: slip.x, top: slip.y, width: slip.width, height: slip.height }}
      >
        <span aria-hidden="true" className="lw-slip-tag">
          <BatchTag stage={batch.stage} number={batch.number} text={batch.contents} size="tideline" />
        </span>
      </Link>
    </li>
  );
}
