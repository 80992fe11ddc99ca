'use client';
import Link from 'next/link';

import { useRead } from '@/components/api/use-api';
import { useClock } from '@/components/session/use-me';
import { Moment } from '@/components/ui/day';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import type { OutputOf } from '@/lib/api/endpoint';
import { listReferenceTables } from '@/lib/reference/contract';
import { documentOf } from '@/lib/reference/own-table';

type Listed = OutputOf<typeof listReferenceTables>['subjects'][number]['tables'][number];

const COLUMNS = [
  { says: 'Table', className: 'w-2/5' },
  { says: 'Edition in force' },
  { says: 'Rows', right: true },
  { says: 'Entered', className: 'w-44' },
];

/** Every table that answers are read from, with the edition in force; the shop's own are marked. */
export function TablesScreen() {
  const { data } = useRead(listReferenceTables, {});
  const own = data.subjects.flatMap(({ tables }) => tables).filter((table) => table.own !== null).length;
  return (
    <>
      <PageHead
        title="Tables of the trade"
        sub={`Checks, requirements and travellers are read from these. Where you enter your own edition, from your own copy of a specification, it takes precedence. ${own === 0 ? 'All are as published.' : `${own} ${own === 1 ? 'is' : 'are'} your own.`}`}
      />
      <div className="flex flex-col gap-7">
        {data.subjects.map(({ subject, tables }) => (
          <Section key={subject} title={subject} note={String(tables.length)}>
            <Table label={subject} columns={COLUMNS}>
              {tables.map((table) => (
                <TableRow key={table.tableId} table={table} />
              ))}
            </Table>
          </Section>
        ))}
      </div>
    </>
  );
}

function TableRow({ table: { tableId, title, own, published, rows } }: { table: Listed }) {
  const clock = useClock();
  return (
    <Row>
      <Cell strong>
        <Link href={`/settings/tables/${tableId}`}>{title}</Link>
      </Cell>
      <Cell head="Edition in force" className="[overflow-wrap:anywhere]">
        {own === null ? (
          <span className="text-quiet">{published}</span>
        ) : (
          <>
            <strong className="font-cond">own</strong> {documentOf(own)}
          </>
        )}
      </Cell>
      <Cell figure head="Rows">
        {rows}
      </Cell>
      <Cell head="Entered">
        {own === null ? (
          <span className="text-quiet">published</span>
        ) : (
          <>
            <Moment at={new Date(own.enteredAt)} clock={clock} /> {own.enteredByName}
          </>
        )}
      </Cell>
    </Row>
  );
}
