import Link from 'next/link';

import { Cell, GroupRow, Row, Table } from '@/components/ui/table';
import { BatchTag } from '@/components/ui/tag';
import { shortDayWords } from '@/lib/day-words';
import type { Tideline, TidelineBatch } from '@/lib/tideline/contract';
import { daysLate } from '@/lib/tideline/lateness';

/** The same batches as a table: everything the line draws, in words. */
export function TidelineList({ tideline }: { tideline: Tideline }) {
  const columns = [
    { says: 'Batch' },
    { says: 'What' },
    { says: 'Out', right: true },
    { says: 'Promised', right: true },
    { says: 'Back', right: true },
    { says: 'Late', right: true },
    { says: 'Holds up' },
  ];
  return (
    <Table label="Batches not yet in stock, by processor" columns={columns}>
      {tideline.lanes.map((lane) => {
        const batches = tideline.batches.filter((batch) => batch.processorId === lane.processorId);
        return [
          <GroupRow key={lane.processorId} says={lane.name} count={batches.length} span={columns.length} />,
          ...batches.map((batch) => <BatchRow key={batch.id} batch={batch} tideline={tideline} />),
        ];
      })}
    </Table>
  );
}

function BatchRow({ batch, tideline }: { batch: TidelineBatch; tideline: Tideline }) {
  const clock = { zone: tideline.zone, now: new Date(tideline.now) };
  const late = daysLate(batch, tideline.today, tideline.latenessBasis);
  return (
    <Row>
      <Cell>
        <BatchTag stage={batch.stage} number={batch.number} href={`/batches/${batch.id}`} size="row" />
      </Cell>
      <Cell>{batch.contents}</Cell>
      <Cell figure head="Out">
        {batch.dispatchedOn && shortDayWords(batch.dispatchedOn, clock)}
      </Cell>
      <Cell figure head="Promised">
        {batch.promisedOn !== null && shortDayWords(batch.promisedOn, clock)}
        {batch.promisedOn === null && batch.dispatchedOn !== null && (
          <span className="font-sans text-quiet">no date yet</span>
        )}
      </Cell>
      <Cell figure right head="Back">
        {batch.dispatchedOn !== null && `${batch.piecesBack} of ${batch.pieces}`}
      </Cell>
      <Cell figure right head="Late">
        {late > 0 && <span className="font-semibold text-held-ink">{late} d</span>}
      </Cell>
      <Cell head="Holds up">
        {batch.assembly && (
          <>
            <Link href={`/assemblies/${batch.assembly.id}`}>{batch.assembly.name}</Link>
            {batch.assembly.neededOn && (
              <span className="text-quiet"> {shortDayWords(batch.assembly.neededOn, clock)}</span>
            )}
          </>
        )}
      </Cell>
    </Row>
  );
}
