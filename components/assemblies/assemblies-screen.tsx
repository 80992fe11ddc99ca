'use client';
import Link from 'next/link';

import { useRead } from '@/components/api/use-api';
import { useClock, useMay } from '@/components/session/use-me';
import { ButtonLink } from '@/components/ui/button';
import { Day, Moment, Until } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { Segments } from '@/components/ui/segments';
import { SteelRule } from '@/components/ui/steel-rule';
import { Cell, Row, Table } from '@/components/ui/table';
import { listAssemblies, type AssemblyRow } from '@/lib/assemblies/contract';

import { RestOnBatch } from './rest-of';

type Closed = '0' | '1';

const COLUMNS = [
  { says: 'Assembly' },
  { says: 'Needed' },
  { says: 'Ready of needed' },
  { says: 'Pieces', right: true },
  { says: 'Where the rest is' },
];
const MOST_BATCHES = 3;

/** What is built, earliest need first, and how far each is. */
export function AssembliesScreen({ closed }: { closed: Closed }) {
  const { data } = useRead(listAssemblies, { closed });
  const may = useMay('assembly.edit');
  return (
    <>
      <PageHead
        title="Assemblies"
        cells={
          <Segments
            label="Which assemblies"
            items={[
              { says: 'Open', href: '/assemblies', current: closed === '0' },
              { says: 'Closed', href: '/assemblies?closed=1', current: closed === '1' },
            ]}
          />
        }
        actions={
          may && (
            <ButtonLink look="primary" href="/assemblies/new" shortcut="A">
              Add an assembly
            </ButtonLink>
          )
        }
      />
      {data.rows.length === 0 && <NoAssemblies closed={closed} may={may} />}
      {data.rows.length > 0 && (
        <Table
          label={closed === '1' ? 'Closed assemblies' : 'Open assemblies'}
          columns={closed === '1' ? CLOSED_COLUMNS : COLUMNS}
        >
          {data.rows.map((row) => (
            <AssemblyLine key={row.id} row={row} />
          ))}
        </Table>
      )}
    </>
  );
}

const CLOSED_COLUMNS = COLUMNS.map((column) =>
  column.says === 'Where the rest is' ? { says: 'Closed' } : column,
);

function NoAssemblies({ closed, may }: { closed: Closed; may: boolean }) {
  if (closed === '1')
    return (
      <Empty
        says="No assembly is closed yet."
        comes="One that is built, or not wanted any more, is closed on its page."
      />
    );
  return (
    <Empty
      says="No assembly is open."
      comes="Enter one with the parts it needs; then this list says what it waits for."
      action={may && <Link href="/assemblies/new">Add an assembly</Link>}
    />
  );
}

function AssemblyLine({ row }: { row: AssemblyRow }) {
  const clock = useClock();
  const tick = Math.max(1, Math.ceil(row.needed / 10));
  return (
    <Row>
      <Cell>
        <Link href={`/assemblies/${row.id}`} className="font-cond text-word">
          {row.name}
        </Link>
      </Cell>
      <Cell head="Needed" className="whitespace-nowrap">
        {row.neededOn && (
          <>
            <Day day={row.neededOn} clock={clock} />{' '}
            {row.closedAt === null && row.ready < row.needed && <Until day={row.neededOn} clock={clock} />}
          </>
        )}
      </Cell>
      <Cell>
        {row.needed > 0 && (
          <SteelRule
            small
            to={row.needed}
            tick={tick}
            number={tick * 5}
            value={row.ready}
            width={150}
            says={`${row.ready} of ${row.needed} pieces ready`}
          />
        )}
      </Cell>
      <Cell figure head="Pieces">
        {row.needed > 0 ? `${row.ready} of ${row.needed}` : ''}
      </Cell>
      <Cell className="py-1.5">
        {row.closedAt === null ? <Rest row={row} /> : <Moment at={new Date(row.closedAt)} clock={clock} />}
      </Cell>
    </Row>
  );
}

function Rest({ row }: { row: AssemblyRow }) {
  const clock = useClock();
  if (row.needed === 0) return <span className="text-quiet">No parts are entered yet.</span>;
  if (row.ready >= row.needed)
    return <span className="text-proved-ink">All it needs is fitted or in stock.</span>;
  if (row.batches.length === 0) return <span className="text-quiet">Nothing of it is on a batch.</span>;
  const more = row.batches.length - MOST_BATCHES;
  return (
    <>
      {row.batches.slice(0, MOST_BATCHES).map((wait) => (
        <RestOnBatch key={wait.id} wait={wait} clock={clock} />
      ))}
      {more > 0 && (
        <Link href={`/assemblies/${row.id}`} className="text-quiet">
          and {more} more {more === 1 ? 'batch' : 'batches'}
        </Link>
      )}
    </>
  );
}
