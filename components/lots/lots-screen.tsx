'use client';

import Link from 'next/link';
import { usePages } from '@/components/api/use-api';
import { useClock, useMay } from '@/components/session/use-me';
import { ButtonLink } from '@/components/ui/button';
import { Day } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { PageHead } from '@/components/ui/page-head';
import { Segments } from '@/components/ui/segments';
import { Cell, Row, Table } from '@/components/ui/table';
import { listLots, type LotRow, type Whereabouts } from '@/lib/lots/contract';
import { PROCESS_WORDS } from '@/lib/trade/process';
import { FindField } from './find-field';
import { KindsSegments } from './kinds-segments';
import { PlacesBar } from './places-bar';
import { ShowMore } from './show-more';

export interface LotFilter {
  text?: string;
  where?: Whereabouts;
  partId?: string;
}

const WHERE_WORDS: Record<Whereabouts, string> = {
  waiting: 'Waiting',
  away: 'Away',
  care: 'Back, not in stock',
  stock: 'In stock',
};
const COLUMNS = [
  { says: 'Lot' },
  { says: 'Part' },
  { says: 'Alloy' },
  { says: 'Heat' },
  { says: 'Made' },
  { says: 'Pieces', right: true },
  { says: 'Where they are' },
  { says: 'Waits for' },
];

/** Every lot, newest first, with where its pieces are. */
export function LotsScreen({ filter }: { filter: LotFilter }) {
  const { data, error, isPending, hasNextPage, fetchNextPage, isFetchingNextPage } = usePages(listLots, {
    ...filter,
  });
  const may = useMay('lot.create');
  const rows = data?.pages.flatMap((page) => page.rows) ?? [];
  const isFiltered = Object.keys(filter).length > 0;
  return (
    <>
      <PageHead
        title="Lots"
        cells={<KindsSegments current="lots" />}
        actions={may && <Actions partId={filter.partId} />}
      />
      <div className="flex flex-wrap items-end gap-x-6 gap-y-3 pb-3">
        <FindField key={filter.partId ?? ''} label="Find a lot, part or heat" text={filter.text ?? ''} />
        <Segments label="Where the pieces are" items={whereItems(filter)} />
      </div>
      {isPending && <Loading label="Loading lots" rows={8} />}
      {error && <Failing says="The lots could not be read." again={error.message} />}
      {data && rows.length === 0 && <NoLots isFiltered={isFiltered} may={may} />}
      {rows.length > 0 && (
        <Table label="Lots" columns={COLUMNS}>
          {rows.map((row) => (
            <LotLine key={row.id} row={row} />
          ))}
        </Table>
      )}
      <ShowMore hasMore={hasNextPage} busy={isFetchingNextPage} more={fetchNextPage} />
    </>
  );
}

function Actions({ partId }: { partId: string | undefined }) {
  return (
    <>
      <ButtonLink href="/lots/import">Import lots</ButtonLink>
      <ButtonLink
        look="primary"
        href={partId === undefined ? '/lots/new' : `/lots/new?part=${partId}`}
        shortcut="A"
      >
        Add a lot
      </ButtonLink>
    </>
  );
}

function NoLots({ isFiltered, may }: { isFiltered: boolean; may: boolean }) {
  if (isFiltered)
    return (
      <Empty
        says="No lot is like that."
        comes="Look at the number again, or at all lots."
        action={<Link href="/lots">Show all lots</Link>}
      />
    );
  return (
    <Empty
      says="There are no lots yet."
      comes="A lot is pieces of one part, made together from one heat."
      action={may && <Link href="/lots/new">Add a lot</Link>}
    />
  );
}

function LotLine({ row }: { row: LotRow }) {
  const clock = useClock();
  return (
    <Row>
      <Cell>
        <Link href={`/lots/${row.id}`} className="num font-semibold">
          {row.number}
        </Link>
        {!row.hasMillCertificate && (
          <span className="block text-source text-dispatched-ink">no mill certificate</span>
        )}
      </Cell>
      <Cell className="max-w-96">
        <Link href={`/parts/${row.part.id}`} className="num font-semibold [overflow-wrap:anywhere]">
          {row.part.number}
        </Link>{' '}
        <span className="whitespace-nowrap text-quiet">rev {row.part.revision}</span>{' '}
        <span className="font-cond">{row.part.name}</span>
      </Cell>
      <Cell head="Alloy">{row.alloy}</Cell>
      <Cell code head="Heat" className="[overflow-wrap:anywhere]">
        {row.heat}
      </Cell>
      <Cell head="Made" className="whitespace-nowrap">
        <Day day={row.madeOn.slice(0, 10)} clock={clock} short />
      </Cell>
      <Cell figure head="Pieces">
        {row.made.toLocaleString('en-US')}
      </Cell>
      <Cell>
        <PlacesBar made={row.made} places={row.places} />
      </Cell>
      <Cell head="Waits for">{row.waitsFor && PROCESS_WORDS[row.waitsFor]}</Cell>
    </Row>
  );
}

function whereItems(filter: LotFilter) {
  const hrefFor = (where: Whereabouts | undefined) => {
    const query = new URLSearchParams({
      ...(filter.text ? { text: filter.text } : {}),
      ...(filter.partId ? { partId: filter.partId } : {}),
      ...(where ? { where } : {}),
    });
    return query.size > 0 ? `/lots?${query.toString()}` : '/lots';
  };
  const item = (where: Whereabouts | undefined, says: string) => ({
    says,
    href: hrefFor(where),
    current: filter.where === where,
  });
  return [
    item(undefined, 'All'),
    ...(Object.keys(WHERE_WORDS) as Whereabouts[]).map((where) => item(where, WHERE_WORDS[where])),
  ];
}
