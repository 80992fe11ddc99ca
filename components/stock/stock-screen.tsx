'use client';
import Link from 'next/link';
import { usePathname, useRouter, useSearchParams } from 'next/navigation';

import { usePages, useRead } from '@/components/api/use-api';
import { FindField } from '@/components/lots/find-field';
import { ShowMore } from '@/components/lots/show-more';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { SelectField } from '@/components/ui/field';
import { Loading } from '@/components/ui/loading';
import { PageHead } from '@/components/ui/page-head';
import { Table } from '@/components/ui/table';
import { listLocations, listStock } from '@/lib/stock/contract';

import { StockLine } from './stock-line';
import { StockSegments } from './stock-segments';

export interface StockFilter {
  text?: string;
  locationId?: string;
}

const COLUMNS = [
  { says: 'Part' },
  { says: 'Lot' },
  { says: 'Condition' },
  { says: 'Heat' },
  { says: 'Place' },
  { says: 'Pieces', right: true },
  { says: 'What can be done', hidden: true },
];

/** Everything that passed the gate and is not fitted yet, by part, lot and place. */
export function StockScreen({ filter }: { filter: StockFilter }) {
  const { data, error, isPending, hasNextPage, fetchNextPage, isFetchingNextPage } = usePages(listStock, {
    ...filter,
  });
  const rows = data?.pages.flatMap((page) => page.rows) ?? [];
  return (
    <>
      <PageHead title="Stock" cells={<StockSegments current="stock" />} />
      <div className="flex flex-wrap items-start gap-x-6 gap-y-3 pb-3">
        <FindField label="Find a part, lot or heat" text={filter.text ?? ''} />
        <PlaceFilter chosen={filter.locationId} />
      </div>
      {isPending && <Loading label="Loading the stock" rows={8} />}
      {error && <Failing says="The stock could not be read." again={error.message} />}
      {data && rows.length === 0 && <NoStock isFiltered={Object.keys(filter).length > 0} />}
      {rows.length > 0 && (
        <Table label="Stock" columns={COLUMNS}>
          {rows.map((row) => (
            <StockLine key={`${row.lotId} ${row.locationId}`} row={row} span={COLUMNS.length} />
          ))}
        </Table>
      )}
      <ShowMore hasMore={hasNextPage} busy={isFetchingNextPage} more={fetchNextPage} />
    </>
  );
}

/** What is chosen stands in the address, so that it can be sent to somebody. */
function PlaceFilter({ chosen }: { chosen: string | undefined }) {
  const router = useRouter();
  const path = usePathname();
  const search = useSearchParams();
  const { data } = useRead(listLocations, {});
  const choose = (id: string) => {
    const next = new URLSearchParams(search);
    if (id === '') next.delete('place');
    else next.set('place', id);
    router.replace(next.size > 0 ? `${path}?${next.toString()}` : path, { scroll: false });
  };
  return (
    <SelectField
      label="Place"
      className="w-56 max-md:w-full"
      empty="Every place"
      value={chosen ?? ''}
      onChange={(event) => choose(event.currentTarget.value)}
      options={data.rows
        .filter((place) => !place.closed || place.pieces > 0)
        .map(({ id, name, pieces }) => ({ value: id, says: `${name}, ${pieces} pc` }))}
    />
  );
}

function NoStock({ isFiltered }: { isFiltered: boolean }) {
  if (isFiltered)
    return (
      <Empty
        says="Nothing in stock is like that."
        comes="Look at the number again, or at every place."
        action={<Link href="/stock">Show all stock</Link>}
      />
    );
  return (
    <Empty
      says="Nothing is in stock."
      comes="Pieces come here through the gate of a batch: counted in, proved and paid."
      action={<Link href="/batches">To the batches</Link>}
    />
  );
}
