'use client';

import Link from 'next/link';
import { usePages } from '@/components/api/use-api';
import { FindField } from '@/components/lots/find-field';
import { KindsSegments } from '@/components/lots/kinds-segments';
import { PlacesBar } from '@/components/lots/places-bar';
import { ShowMore } from '@/components/lots/show-more';
import { useMay } from '@/components/session/use-me';
import { ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { PageHead } from '@/components/ui/page-head';
import { Segments } from '@/components/ui/segments';
import { Cell, Row, Table } from '@/components/ui/table';
import { materialWords } from '@/lib/batches/material-words';
import { listParts, type PartRow } from '@/lib/parts/contract';
import { PROCESS_WORDS } from '@/lib/trade/process';

export interface PartFilter {
  text?: string;
  superseded?: '1';
}

const COLUMNS = [
  { says: 'Part' },
  { says: 'Material' },
  { says: 'Thickness', right: true },
  { says: 'Condition' },
  { says: 'Outside steps' },
  { says: 'Lots', right: true },
  { says: 'Where its pieces are' },
];

/** Every part by its drawing number. */
export function PartsScreen({ filter }: { filter: PartFilter }) {
  const { data, error, isPending, hasNextPage, fetchNextPage, isFetchingNextPage } = usePages(listParts, {
    ...filter,
  });
  const may = useMay('part.edit');
  const rows = data?.pages.flatMap((page) => page.rows) ?? [];
  return (
    <>
      <PageHead
        title="Parts"
        cells={<KindsSegments current="parts" />}
        actions={
          may && (
            <ButtonLink look="primary" href="/parts/new" shortcut="A">
              Add a part
            </ButtonLink>
          )
        }
      />
      <div className="flex flex-wrap items-end gap-x-6 gap-y-3 pb-3">
        <FindField label="Find a number, name or alloy" text={filter.text ?? ''} />
        <Segments label="Revisions" items={revisionItems(filter)} />
      </div>
      {isPending && <Loading label="Loading parts" rows={8} />}
      {error && <Failing says="The parts could not be read." again={error.message} />}
      {data && rows.length === 0 && <NoParts isFiltered={filter.text !== undefined} may={may} />}
      {rows.length > 0 && (
        <Table label="Parts" columns={COLUMNS}>
          {rows.map((row) => (
            <PartLine key={row.id} row={row} />
          ))}
        </Table>
      )}
      <ShowMore hasMore={hasNextPage} busy={isFetchingNextPage} more={fetchNextPage} />
    </>
  );
}

function NoParts({ isFiltered, may }: { isFiltered: boolean; may: boolean }) {
  if (isFiltered)
    return (
      <Empty
        says="No part is like that."
        comes="Look at the number again, or at all parts."
        action={<Link href="/parts">Show all parts</Link>}
      />
    );
  return (
    <Empty
      says="There are no parts yet."
      comes="A part is a drawing number, what it is made from and its way through outside processes."
      action={may && <Link href="/parts/new">Add a part</Link>}
    />
  );
}

function PartLine({ row }: { row: PartRow }) {
  const made = row.places.reduce((sum, { pieces }) => sum + pieces, 0);
  return (
    <Row state={row.supersededAt === null ? 'rest' : 'off'}>
      <Cell className="max-w-md">
        <Link href={`/parts/${row.id}`} className="num font-semibold [overflow-wrap:anywhere]">
          {row.number}
        </Link>{' '}
        <span className="whitespace-nowrap text-quiet">rev {row.revision}</span>{' '}
        <span className="font-cond">{row.name}</span>
        {row.supersededAt !== null && <span className="text-quiet">, superseded</span>}
      </Cell>
      <Cell head="Material" className="whitespace-nowrap">
        {materialWords(row)}
      </Cell>
      <Cell figure head="Thickness" className="whitespace-nowrap">
        {row.thickness}
      </Cell>
      <Cell head="Condition">
        <Conditions made={row.madeCondition} end={row.endCondition} />
      </Cell>
      <Cell head="Steps">
        {row.processes.length === 0 ? (
          <span className="text-dispatched-ink">none yet</span>
        ) : (
          row.processes.map((process) => PROCESS_WORDS[process]).join(', then ')
        )}
      </Cell>
      <Cell figure head="Lots">
        {row.lots}
      </Cell>
      <Cell>{made > 0 && <PlacesBar made={made} places={row.places} />}</Cell>
    </Row>
  );
}

/** `O to T42`, as on the traveller. */
export function Conditions({ made, end }: { made: string; end: string }) {
  return (
    <>
      <span className="num">{made}</span>
      {made !== end && (
        <>
          <span className="text-source text-quiet"> to </span>
          <span className="num">{end}</span>
        </>
      )}
    </>
  );
}

function revisionItems({ text, superseded }: PartFilter) {
  const hrefFor = (all: boolean) => {
    const query = new URLSearchParams({ ...(text ? { text } : {}), ...(all ? { superseded: '1' } : {}) });
    return query.size > 0 ? `/parts?${query.toString()}` : '/parts';
  };
  return [
    { says: 'Current', href: hrefFor(false), current: superseded === undefined },
    { says: 'With superseded', href: hrefFor(true), current: superseded === '1' },
  ];
}
