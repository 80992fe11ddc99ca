'use client';
import { usePages } from '@/components/api/use-api';
import { ShowMore } from '@/components/lots/show-more';
import { useClock, useMay } from '@/components/session/use-me';
import { ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { PageHead } from '@/components/ui/page-head';
import { Pieces } from '@/components/ui/pieces';
import { Segments } from '@/components/ui/segments';
import { STAGE_WORDS } from '@/components/ui/stages';
import { Cell, Row, Table } from '@/components/ui/table';
import { BatchTag } from '@/components/ui/tag';
import { listBatches, type BatchRow } from '@/lib/batches/contract';
import { STAGES, type Stage } from '@/lib/batches/stage';
import { calendarDay, shortDayWords, type Clock } from '@/lib/day-words';
import { PROCESS_WORDS } from '@/lib/trade/process';

export interface BatchFilter {
  stage?: Stage;
}

const COLUMNS = [
  { says: 'Batch' },
  { says: 'Processor' },
  { says: 'Step' },
  { says: 'Pieces', right: true },
  { says: 'Left' },
  { says: 'Back' },
  { says: 'Order' },
];

/** Every batch, newest first; the stage stands in the address. */
export function BatchesScreen({ filter }: { filter: BatchFilter }) {
  const mayBuild = useMay('batch.build');
  const clock = useClock();
  const { data, error, isPending, hasNextPage, fetchNextPage, isFetchingNextPage } = usePages(listBatches, {
    ...filter,
  });
  const rows = data?.pages.flatMap((page) => page.rows) ?? [];
  return (
    <>
      <PageHead
        title="Batches"
        actions={
          mayBuild && (
            <ButtonLink look="primary" href="/batches/new" shortcut="A">
              Start a batch
            </ButtonLink>
          )
        }
      />
      <div className="pb-3">
        <Segments
          label="Stage"
          items={[
            { says: 'All', href: '/batches', current: filter.stage === undefined },
            ...STAGES.map((stage) => ({
              says: STAGE_WORDS[stage],
              href: `/batches?stage=${stage}`,
              current: filter.stage === stage,
            })),
          ]}
        />
      </div>
      {isPending && <Loading label="Loading batches" rows={8} />}
      {error && <Failing says="The batches could not be read." again={error.message} />}
      {data &&
        rows.length === 0 &&
        (filter.stage ? (
          <Empty says={`No batch is ${STAGE_WORDS[filter.stage]}.`} />
        ) : (
          <Empty
            says="There is no batch yet."
            comes="It gathers lots that wait for the same step and sends them to one processor."
          />
        ))}
      {rows.length > 0 && (
        <Table label="Batches" columns={COLUMNS}>
          {rows.map((row) => (
            <BatchLine key={row.id} row={row} clock={clock} />
          ))}
        </Table>
      )}
      <ShowMore hasMore={hasNextPage} busy={isFetchingNextPage} more={fetchNextPage} />
    </>
  );
}

function BatchLine({ row, clock }: { row: BatchRow; clock: Clock }) {
  const day = (at: string) => shortDayWords(calendarDay(new Date(at), clock.zone), clock);
  const isPart = row.piecesBack > 0 && row.piecesBack < row.pieces;
  return (
    <Row>
      <Cell>
        <BatchTag
          href={`/batches/${row.id}`}
          size="list"
          stage={row.stage}
          number={row.number}
          daysLate={row.daysLate}
        />
      </Cell>
      <Cell strong>{row.processor}</Cell>
      <Cell head="Step">{PROCESS_WORDS[row.process]}</Cell>
      <Cell figure head="Pieces">
        {isPart ? <Pieces count={row.piecesBack} of={row.pieces} /> : row.pieces.toLocaleString('en-US')}
      </Cell>
      {/* "Leaves 3 Dec" and "promised 8 Dec" say their column themselves. */}
      <Cell {...(row.dispatchedAt ? { head: 'Left' } : {})}>{leftWords(row, clock, day)}</Cell>
      <Cell {...(row.lastBackAt ? { head: 'Back' } : {})}>
        {row.daysLate > 0 ? (
          <strong className="text-held-ink">{row.daysLate} d late</strong>
        ) : (
          backWords(row, clock, day)
        )}
      </Cell>
      <Cell code head="Order" className="whitespace-nowrap">
        {row.orderNumber}
      </Cell>
    </Row>
  );
}

function leftWords(row: BatchRow, clock: Clock, day: (at: string) => string): string {
  if (row.dispatchedAt) return day(row.dispatchedAt);
  if (row.stage === 'cancelled') return '';
  if (row.putAsideAt) return 'put aside';
  if (!row.leavesOn) return '';
  return `${row.leavesOn < calendarDay(clock.now, clock.zone) ? 'should have left' : 'leaves'} ${shortDayWords(row.leavesOn, clock)}`;
}

function backWords(row: BatchRow, clock: Clock, day: (at: string) => string): string {
  if (row.stage === 'cancelled') return '';
  if (row.lastBackAt && row.piecesBack >= row.pieces) return day(row.lastBackAt);
  if (row.promisedOn) return `promised ${shortDayWords(row.promisedOn, clock)}`;
  return row.wantedBackOn ? `wanted ${shortDayWords(row.wantedBackOn, clock)}` : 'no date yet';
}
