'use client';
import Link from 'next/link';
import { useState } from 'react';

import { useRead } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Until } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { PageHead } from '@/components/ui/page-head';
import { Segments } from '@/components/ui/segments';
import { Cell, GroupRow, Row, Table } from '@/components/ui/table';
import { BatchTag } from '@/components/ui/tag';
import { daysUntil, shortDayWords, type Clock } from '@/lib/day-words';
import { ApiError, call } from '@/lib/api/client';
import { listPortalBatches, type PortalRow } from '@/lib/portal/contract';

import { openOf, workGroups } from './work-groups';

interface WorkListProps {
  shopId: string | undefined;
  show: 'open' | 'finished';
  now: string;
}

/** On a tablet ten columns leave none of them room; on a phone a row is a block and has it. */
const ON_WIDE = 'md:max-lg:hidden';

const COLUMNS = [
  { says: 'Batch' },
  { says: 'Shop' },
  { says: 'Pieces', right: true },
  { says: 'Parts' },
  { says: 'Material', className: ON_WIDE },
  { says: 'Asked' },
  { says: 'Thickness', className: ON_WIDE },
  { says: 'Promised' },
  { says: 'Open', hidden: true },
  { says: 'Go', hidden: true },
];

/** All work of the processor, for all its shops, worst first. */
export function WorkList({ shopId, show, now }: WorkListProps) {
  const { data } = useRead(listPortalBatches, { show });
  const earlier = useEarlier(show, data.next);
  const all = [...data.rows, ...earlier.rows];
  const clock = { zone: data.zone, now: new Date(now) };
  const rows = shopId === undefined ? all : all.filter((row) => row.shopId === shopId);
  return (
    <>
      <PageHead
        title="Work"
        sub={<Summary rows={rows} show={show} clock={clock} />}
        actions={<Filters all={all} shopId={shopId} show={show} />}
      />
      {rows.length === 0 ? <Nothing show={show} /> : <WorkTable rows={rows} show={show} clock={clock} />}
      {earlier.next !== null && (
        <div className="py-4">
          <Button busyLabel="Loading" onClick={earlier.load}>
            Show earlier ones
          </Button>
        </div>
      )}
      {earlier.failed && <Failing says={earlier.failed} />}
    </>
  );
}

/** Older pages, asked for by hand: hardly any processor has more than the first. */
function useEarlier(show: WorkListProps['show'], first: string | null) {
  const [loaded, setLoaded] = useState<{ rows: PortalRow[]; next: string | null } | null>(null);
  const [failed, setFailed] = useState<string | null>(null);
  const next = loaded === null ? first : loaded.next;
  const load = async () => {
    if (next === null) return;
    try {
      const page = await call(listPortalBatches, { show, after: next });
      setLoaded({ rows: [...(loaded?.rows ?? []), ...page.rows], next: page.next });
      setFailed(null);
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      setFailed(error.problem.title);
    }
  };
  return { rows: loaded?.rows ?? [], next, load, failed };
}

function Summary({
  rows,
  show,
  clock,
}: {
  rows: readonly PortalRow[];
  show: WorkListProps['show'];
  clock: Clock;
}) {
  const shops = new Set(rows.map((row) => row.shopId)).size;
  const late = rows.filter(
    (row) =>
      show === 'open' &&
      row.shippedAt === null &&
      row.promisedOn !== null &&
      daysUntil(row.promisedOn, clock) < 0 &&
      row.piecesBack < row.pieces,
  ).length;
  const toCount = rows.filter((row) => row.acknowledgedAt === null && row.piecesBack === 0).length;
  return (
    <>
      {rows.length} {rows.length === 1 ? 'batch' : 'batches'} from {shops} {shops === 1 ? 'shop' : 'shops'}.
      {late > 0 && <strong className="text-held-ink"> {late} late.</strong>}
      {show === 'open' && toCount > 0 && <> {toCount} to acknowledge.</>}
    </>
  );
}

function Filters({
  all,
  shopId,
  show,
}: {
  all: readonly PortalRow[];
  shopId: string | undefined;
  show: WorkListProps['show'];
}) {
  const shops = [...new Map(all.map((row) => [row.shopId, row.shop]))].sort((one, other) =>
    one[1].localeCompare(other[1]),
  );
  const href = (query: Record<string, string>) =>
    `/portal${Object.keys(query).length > 0 ? `?${new URLSearchParams(query)}` : ''}`;
  const shown: Record<string, string> = show === 'finished' ? { show } : {};
  return (
    <>
      {shops.length > 1 && (
        <Segments
          label="Shop"
          items={[
            { says: 'All shops', current: shopId === undefined, href: href(shown) },
            ...shops.map(([id, name]) => ({
              says: name,
              count: all.filter((row) => row.shopId === id).length,
              current: id === shopId,
              href: href({ ...shown, shop: id }),
            })),
          ]}
        />
      )}
      <Segments
        label="Show"
        items={[
          { says: 'Open', current: show === 'open', href: href({}) },
          { says: 'Finished', current: show === 'finished', href: href({ show: 'finished' }) },
        ]}
      />
    </>
  );
}

function Nothing({ show }: { show: WorkListProps['show'] }) {
  if (show === 'finished')
    return (
      <Empty
        says="Nothing is finished yet."
        comes="A batch comes here when its papers are accepted and its invoice is paid."
      />
    );
  return (
    <Empty
      says="No batch is on its way to you or with you."
      comes="A batch comes here when a shop dispatches it; you get a mail at the same time."
    />
  );
}

function WorkTable({
  rows,
  show,
  clock,
}: {
  rows: readonly PortalRow[];
  show: WorkListProps['show'];
  clock: Clock;
}) {
  const groups =
    show === 'open' ? workGroups(rows, clock) : [{ says: 'Finished, newest first', rows: [...rows] }];
  return (
    <Table label="Work" columns={COLUMNS}>
      {groups.flatMap((group) => [
        <GroupRow key={group.says} says={group.says} count={group.rows.length} span={COLUMNS.length} />,
        ...group.rows.map((row) => <WorkRow key={row.id} row={row} clock={clock} open={show === 'open'} />),
      ])}
    </Table>
  );
}

function WorkRow({ row, clock, open }: { row: PortalRow; clock: Clock; open: boolean }) {
  const href = `/portal/batches/${row.id}`;
  const todo = openOf(row);
  return (
    <Row>
      <Cell>
        <BatchTag size="row" stage={row.stage} number={row.number} href={href} />
      </Cell>
      <Cell strong className="font-cond break-words lg:whitespace-nowrap">
        {row.shop}
      </Cell>
      <Cell figure strong head="Pieces">
        {row.pieces.toLocaleString('en-US')}
      </Cell>
      <Cell className="break-words">{someOf(row.parts, '; ')}</Cell>
      <Cell className={ON_WIDE}>{someOf(row.materials)}</Cell>
      <Cell className="font-cond">{row.asked}</Cell>
      <Cell code head="Thickness" className={ON_WIDE}>
        {someOf(row.thicknesses)}
      </Cell>
      <Cell className="whitespace-nowrap">
        <Promised row={row} clock={clock} open={open} />
      </Cell>
      <Cell quiet className="xl:whitespace-nowrap">
        {open && todo.says}
      </Cell>
      <Cell right>
        {open && (
          <Link
            href={todo.verb === 'Answer' || todo.verb === 'Read' ? `${href}#messages` : href}
            className="lw-word-button whitespace-nowrap"
            aria-label={`${todo.verb} ${row.number}`}
          >
            {todo.verb}
          </Link>
        )}
      </Cell>
    </Row>
  );
}

function Promised({ row, clock, open }: { row: PortalRow; clock: Clock; open: boolean }) {
  if (row.lastBackAt !== null && row.piecesBack >= row.pieces)
    return <span className="text-quiet">back {shortDayWords(new Date(row.lastBackAt), clock)}</span>;
  if (row.shippedAt !== null)
    return <span className="text-quiet">shipped {shortDayWords(new Date(row.shippedAt), clock)}</span>;
  if (row.promisedOn !== null && open) {
    return (
      <span className="whitespace-nowrap">
        <Until day={row.promisedOn} clock={clock} />{' '}
        <span className="text-quiet">{shortDayWords(row.promisedOn, clock)}</span>
      </span>
    );
  }
  return (
    <span className="text-quiet">
      {row.wantedBackOn === null ? 'no day asked' : `asked ${shortDayWords(row.wantedBackOn, clock)}`}
    </span>
  );
}

const someOf = (words: readonly string[], between = ', '): string =>
  words.slice(0, 2).join(between) + (words.length > 2 ? ` and ${words.length - 2} more` : '');
