'use client';
import Link from 'next/link';

import { usePages } from '@/components/api/use-api';
import { useClock, useMay } from '@/components/session/use-me';
import { Button, ButtonLink } from '@/components/ui/button';
import { Day } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { PageHead } from '@/components/ui/page-head';
import { Cell, Row, Table } from '@/components/ui/table';
import { daysUntil, type Clock } from '@/lib/day-words';
import { PROCESS_WORDS } from '@/lib/trade/process';
import { listProcessors, type ProcessorRow } from '@/lib/processors/contract';

/** Within these days of its end an approval is said in straw. */
const ENDS_SOON_DAYS = 30;

export function ProcessorsScreen() {
  const { data, error, isPending, hasNextPage, fetchNextPage, isFetchingNextPage } = usePages(
    listProcessors,
    {},
  );
  const mayEdit = useMay('processor.edit');
  const clock = useClock();
  return (
    <>
      <PageHead
        title="Processors"
        sub="Whom the shop sends parts to, for what, and until when."
        actions={
          mayEdit && (
            <ButtonLink href="/processors/new" look="primary">
              Add a processor
            </ButtonLink>
          )
        }
      />
      {isPending && <Loading />}
      {error && <Failing says="The processors could not be read." again={error.message} />}
      {data && data.pages[0]?.rows.length === 0 && (
        <Empty
          says="No processor yet."
          comes="A processor comes here when somebody adds it with its e-mail."
        />
      )}
      {data && data.pages[0]?.rows.length !== 0 && (
        <Table
          label="Processors"
          columns={[
            { says: 'Processor', sorted: 'up' },
            { says: 'Contact' },
            { says: 'Approved today for' },
            { says: 'Approved to' },
            { says: 'Batches', right: true },
            { says: 'Pieces out', right: true },
          ]}
        >
          {data.pages
            .flatMap((page) => page.rows)
            .map((row) => (
              <ProcessorLine key={row.processorId} row={row} clock={clock} />
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
            More processors
          </Button>
        </div>
      )}
    </>
  );
}

function ProcessorLine({ row, clock }: { row: ProcessorRow; clock: Clock }) {
  return (
    <Row state={row.active ? 'rest' : 'off'}>
      <Cell strong>
        <Link href={`/processors/${row.processorId}`}>{row.name}</Link>
        {!row.active && <span className="font-normal text-quiet"> no longer used</span>}
      </Cell>
      <Cell head="Contact">
        {row.contactName}
        <span className="block [overflow-wrap:anywhere] text-quiet">{row.contactEmail}</span>
      </Cell>
      <Cell head="Approved today for">
        {row.processes.length === 0 ? (
          <span className="text-held-ink">nothing</span>
        ) : (
          row.processes.map((process) => PROCESS_WORDS[process]).join(', ')
        )}
      </Cell>
      <Cell head="Approved to" className="whitespace-nowrap">
        {row.approvalEndsOn !== null && <ApprovalEnd day={row.approvalEndsOn} clock={clock} />}
      </Cell>
      <Cell figure head="Batches">
        {row.openBatches || ''}
      </Cell>
      <Cell figure head="Pieces out">
        {row.piecesOut || ''}
      </Cell>
    </Row>
  );
}

/** In its last days it says so, while there is time to renew it. */
export function ApprovalEnd({ day, clock }: { day: string; clock: Clock }) {
  const left = daysUntil(day, clock);
  const isSoon = left >= 0 && left <= ENDS_SOON_DAYS;
  return (
    <span className={isSoon ? 'text-dispatched-ink' : ''}>
      <Day day={day} clock={clock} />
      {isSoon && <strong>{left === 0 ? ', today' : `, in ${left} d`}</strong>}
    </span>
  );
}
