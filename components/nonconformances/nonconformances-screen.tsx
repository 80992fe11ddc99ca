'use client';
import { usePages } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { PageHead } from '@/components/ui/page-head';
import { GroupRow, Table } from '@/components/ui/table';
import { listNonconformances } from '@/lib/nonconformances/contract';

import { NONCONFORMANCE_COLUMNS, NonconformanceLine } from './nonconformance-line';

/** What holds pieces up, oldest harm in words; then what was decided. */
export function NonconformancesScreen() {
  const { data, error, isPending, hasNextPage, fetchNextPage, isFetchingNextPage } = usePages(
    listNonconformances,
    {},
  );
  const rows = data?.pages.flatMap((page) => page.rows) ?? [];
  const open = rows.filter((row) => row.closedAt === null);
  const closed = rows.filter((row) => row.closedAt !== null);
  return (
    <>
      <PageHead
        title="Nonconformances"
        sub={data && (open.length === 0 ? 'None is open.' : `${open.length} open`)}
      />
      {isPending && <Loading label="Loading nonconformances" rows={8} />}
      {error && <Failing says="The nonconformances could not be read." again={error.message} />}
      {data && rows.length === 0 && (
        <Empty
          says="Nothing is held, and nothing was."
          comes="Damaged and short pieces come here from a count, others from the bench where certificates are proved."
        />
      )}
      {rows.length > 0 && (
        <Table label="Nonconformances" columns={NONCONFORMANCE_COLUMNS}>
          {open.length > 0 && <GroupRow says="Open" span={NONCONFORMANCE_COLUMNS.length} />}
          {open.map((row) => (
            <NonconformanceLine key={row.id} row={row} />
          ))}
          {closed.length > 0 && <GroupRow says="Decided" span={NONCONFORMANCE_COLUMNS.length} />}
          {closed.map((row) => (
            <NonconformanceLine key={row.id} row={row} />
          ))}
        </Table>
      )}
      {hasNextPage && (
        <div className="pt-3">
          <Button
            size="small"
            busy={isFetchingNextPage}
            busyLabel="Reading on"
            onClick={() => fetchNextPage().then(() => undefined)}
          >
            Show more
          </Button>
        </div>
      )}
    </>
  );
}
