'use client';
import Link from 'next/link';
import Papa from 'papaparse';

import { useRead } from '@/components/api/use-api';
import { saveText } from '@/components/files/save-text';
import { WideRows } from '@/components/plots/wide-rows';
import { useClock, useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { Edge } from '@/components/ui/edge';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { getReferenceTable, type ReferenceTable, type TableEntry } from '@/lib/reference/contract';
import { documentOf } from '@/lib/reference/own-table';

import { EnterTable } from './enter-table';
import { WithdrawTable } from './withdraw-table';

interface TableScreenProps {
  tableId: string;
  /** An earlier edition to look at; without it, the one in force. */
  entryId?: string | undefined;
}

/** One table of the trade: the rows in force, whose they are, what was in force before, and the way to one's own. */
export function TableScreen({ tableId, entryId }: TableScreenProps) {
  const { data: table } = useRead(getReferenceTable, {
    tableId,
    ...(entryId !== undefined && { entryId }),
  });
  const mayEdit = useMay('reference.edit');
  const { shown, isInForce, inForce } = table;
  return (
    <>
      <PageHead
        title={table.title}
        sub={
          <>
            <Link href="/settings/tables">Tables of the trade</Link>.{' '}
            {shown === null ? `As published: ${table.published}.` : `Your own: ${documentOf(shown)}.`}
          </>
        }
        actions={
          <>
            <Button onClick={() => saveText(`${tableId}.csv`, csvOf(table))}>Save as CSV</Button>
            {mayEdit && isInForce && inForce !== null && <WithdrawTable table={table} entry={inForce} />}
          </>
        }
      />
      {!isInForce && (
        <Edge level="warn">
          This edition is not in force any more; it is kept because what was frozen names it.{' '}
          <Link href={`/settings/tables/${tableId}`}>Show the one in force</Link>
        </Edge>
      )}
      <div className="flex flex-col gap-7">
        <RowsOfTable table={table} />
        {mayEdit && isInForce && <EnterTable key={inForce?.id} table={table} />}
        <HistoryOfTable table={table} />
      </div>
    </>
  );
}

function RowsOfTable({ table: { title, columns, cells, sources } }: { table: ReferenceTable }) {
  // A column in which no row says anything is left out here; the file has it.
  const shown = columns.flatMap(({ head }, at) => (cells.some((row) => row[at]) ? [{ head, at }] : []));
  return (
    <Section title="Rows" note={String(cells.length)}>
      <WideRows
        label={`Rows of ${title}`}
        heads={[...shown.map(({ head }) => head), 'Where from, and how sure']}
        rows={cells.map((row, at) => [
          ...shown.map((column) => row[column.at]),
          <span key="source" className="block min-w-64 font-sans text-source text-quiet">
            {sources[at]}
          </span>,
        ])}
      />
    </Section>
  );
}

const HISTORY_COLUMNS = [
  { says: 'Edition' },
  { says: 'Rows', right: true },
  { says: 'Entered' },
  { says: 'What became of it' },
];

function HistoryOfTable({ table: { history, tableId, published, inForce } }: { table: ReferenceTable }) {
  return (
    <Section title="Editions" note={inForce === null ? 'the published one is in force' : 'yours is in force'}>
      <Table label="Editions of this table" columns={HISTORY_COLUMNS}>
        {history.map((entry) => (
          <EditionRow key={entry.id} entry={entry} tableId={tableId} />
        ))}
        <Row>
          <Cell className="[overflow-wrap:anywhere]">{published}</Cell>
          <Cell figure head="Rows" />
          <Cell head="Entered">
            <span className="text-quiet">published</span>
          </Cell>
          <Cell head="What became of it">{inForce === null ? 'in force' : 'stands behind yours'}</Cell>
        </Row>
      </Table>
    </Section>
  );
}

function EditionRow({ entry, tableId }: { entry: TableEntry; tableId: string }) {
  const clock = useClock();
  const ended = entry.withdrawnAt ?? entry.supersededAt;
  return (
    <Row>
      <Cell strong className="[overflow-wrap:anywhere]">
        <Link href={`/settings/tables/${tableId}${ended === null ? '' : `?edition=${entry.id}`}`}>
          {documentOf(entry)}
        </Link>
      </Cell>
      <Cell figure head="Rows">
        {entry.rows}
      </Cell>
      <Cell head="Entered">
        <Moment at={new Date(entry.enteredAt)} clock={clock} /> {entry.enteredByName}
      </Cell>
      <Cell head="What became of it">
        {ended === null ? (
          'in force'
        ) : (
          <>
            {entry.withdrawnAt === null ? 'followed by another' : 'withdrawn'}{' '}
            <Moment at={new Date(ended)} clock={clock} />
          </>
        )}
      </Cell>
    </Row>
  );
}

const csvOf = ({ columns, cells }: ReferenceTable): string =>
  Papa.unparse({ fields: columns.map(({ head }) => head), data: cells.map((row) => [...row]) });
