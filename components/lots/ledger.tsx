'use client';

import { usePages } from '@/components/api/use-api';
import { useClock } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { listMovements, type MovementRow } from '@/lib/lots/contract';
import { spotWords } from './place-words';

const COLUMNS = [
  { says: 'When' },
  { says: 'Who' },
  { says: 'Pieces', right: true },
  { says: 'From' },
  { says: 'To' },
  { says: 'Why' },
];

/** Every movement of the lot's pieces: what the picture above is the sum of. */
export function Ledger({ lotId, made }: { lotId: string; made: number }) {
  const clock = useClock();
  const { data, error, isPending, hasNextPage, fetchNextPage, isFetchingNextPage } = usePages(listMovements, {
    lotId,
  });
  const rows = data?.pages.flatMap((page) => page.rows) ?? [];
  return (
    <Section title="Ledger" note="newest first; rows are only ever added">
      {isPending && <Loading label="Loading the ledger" rows={3} />}
      {error && <Failing says="The ledger could not be read." again={error.message} />}
      {rows.length > 0 && (
        <Table label="Movements" columns={COLUMNS} dense>
          {rows.map((row) => (
            <Row key={row.id}>
              <Cell head="When">
                <Moment at={new Date(row.at)} clock={clock} />
              </Cell>
              <Cell head="Who">{row.by}</Cell>
              <Cell figure head="Pieces">
                {row.pieces.toLocaleString('en-US')}
              </Cell>
              <Cell head="From">
                {row.from === null ? <span className="text-quiet">made</span> : spotWords(row.from)}
              </Cell>
              <Cell head="To">{spotWords(row.to)}</Cell>
              <Cell head="Why" className="break-words">
                <Why row={row} made={made} />
              </Cell>
            </Row>
          ))}
        </Table>
      )}
      {hasNextPage && (
        <div className="pt-3">
          <Button
            size="small"
            busy={isFetchingNextPage}
            busyLabel="Reading further back"
            onClick={() => fetchNextPage().then(() => undefined)}
          >
            Further back
          </Button>
        </div>
      )}
    </Section>
  );
}

/** Serials only where not all pieces went: otherwise each row would repeat them all. */
function Why({ row, made }: { row: MovementRow; made: number }) {
  return (
    <>
      {row.reason.replaceAll('_', ' ')}
      {row.note && <span className="text-quiet">, {row.note}</span>}
      {row.serials.length > 0 && row.serials.length < made && (
        <span className="num block text-source text-quiet">{row.serials.join(', ')}</span>
      )}
    </>
  );
}
