'use client';
import { usePages } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Day } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { BatchTag } from '@/components/ui/tag';
import { useClock } from '@/components/session/use-me';
import { listBatches, type BatchRow } from '@/lib/batches/contract';
import { calendarDay, type Clock } from '@/lib/day-words';
import { PROCESS_WORDS } from '@/lib/trade/process';

/** Everything that ever went there, newest first. */
export function ProcessorBatches({ processorId, now }: { processorId: string; now: Date }) {
  const { zone } = useClock();
  const { data, error, isPending, hasNextPage, fetchNextPage, isFetchingNextPage } = usePages(listBatches, {
    processorId,
    limit: 20,
  });
  const rows = data?.pages.flatMap((page) => page.rows) ?? [];
  return (
    <Section title="Batches" note="newest first">
      {isPending && <Loading />}
      {error && <Failing says="The batches could not be read." again={error.message} />}
      {data && rows.length === 0 && <Empty says="No batch went there yet." />}
      {rows.length > 0 && (
        <Table
          label="Batches"
          columns={[
            { says: 'Batch' },
            { says: 'Order' },
            { says: 'Process' },
            { says: 'Pieces', right: true },
            { says: 'Out' },
            { says: 'Promised' },
          ]}
        >
          {rows.map((row) => (
            <BatchLine key={row.id} row={row} clock={{ zone, now }} />
          ))}
        </Table>
      )}
      {hasNextPage && (
        <div className="pt-3">
          <Button
            size="small"
            busy={isFetchingNextPage}
            onClick={() => fetchNextPage().then(() => undefined)}
          >
            Older batches
          </Button>
        </div>
      )}
    </Section>
  );
}

function BatchLine({ row, clock }: { row: BatchRow; clock: Clock }) {
  return (
    <Row>
      <Cell>
        <BatchTag stage={row.stage} number={row.number} size="row" href={`/batches/${row.id}`} />
      </Cell>
      <Cell code head="Order" className="whitespace-nowrap">
        {row.orderNumber}
      </Cell>
      <Cell head="Process">{PROCESS_WORDS[row.process]}</Cell>
      <Cell figure head="Pieces">
        {row.pieces}
      </Cell>
      <Cell head="Out">
        {row.dispatchedAt !== null && (
          <Day day={calendarDay(new Date(row.dispatchedAt), clock.zone)} clock={clock} short />
        )}
      </Cell>
      <Cell head="Promised">
        {row.promisedOn !== null && <Day day={row.promisedOn} clock={clock} short />}
      </Cell>
    </Row>
  );
}
