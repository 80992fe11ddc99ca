'use client';
import { useState } from 'react';

import { useWrite } from '@/components/api/use-api';
import { readSheet } from '@/components/files/read-sheet';
import { FileDrop } from '@/components/ui/file-drop';
import { Loading } from '@/components/ui/loading';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import type { OutputOf } from '@/lib/api/endpoint';
import { checkOwnTable, MOST_TABLE_ROWS, type ReferenceTable } from '@/lib/reference/contract';

import { EnterTableForm } from './enter-table-form';

/** A file as it was read, with what is wrong in it. */
export interface ReadTable {
  name: string;
  heads: string[];
  cells: string[][];
  checked: OutputOf<typeof checkOwnTable>;
}

/** One's own edition from a spreadsheet: every row is looked through first, and entered whole or not at all. */
export function EnterTable({ table }: { table: ReferenceTable }) {
  const [read, setRead] = useState<ReadTable | null>(null);
  const [fault, setFault] = useState<string>();
  const check = useWrite(checkOwnTable);

  const take = async ([file]: File[]) => {
    if (!file) return;
    setRead(null);
    setFault(undefined);
    const sheet = await readSheet(file, MOST_TABLE_ROWS);
    if (!sheet.ok) return setFault(sheet.message);
    const { heads, cells } = sheet;
    try {
      const checked = await check.mutateAsync({ tableId: table.tableId, heads, cells });
      if (checked.fault !== null) return setFault(`${file.name}: ${checked.fault}`);
      setRead({ name: file.name, heads, cells, checked });
    } catch (error) {
      setFault(error instanceof Error ? error.message : 'The file could not be looked through. Try again.');
    }
  };
  return (
    <Section
      title="Enter your own edition"
      note="save the table as CSV, change it to what your copy says, choose it here"
    >
      <FileDrop
        className="pt-1"
        label={read ? 'Choose the file again, or another' : 'CSV file of the table'}
        accept=".csv,.tsv,.txt,text/csv"
        onFiles={(files) => void take(files)}
        error={fault}
        hint="nothing is entered until you have seen what is in it"
      />
      {check.isPending && <Loading label="Looking through the file" />}
      {read && <EnterTableForm key={read.name} table={table} read={read} />}
      <ColumnsOfTable table={table} />
    </Section>
  );
}

function ColumnsOfTable({ table: { columns } }: { table: ReferenceTable }) {
  return (
    <details className="pt-2">
      <summary className="cursor-pointer font-cond text-word underline">What stands in each column</summary>
      <Table
        label="Columns of the file"
        columns={[{ says: 'Column' }, { says: 'What may stand in it' }]}
        dense
      >
        {columns.map(({ head, says }) => (
          <Row key={head}>
            <Cell strong>{head}</Cell>
            <Cell className="[overflow-wrap:anywhere]">{says}</Cell>
          </Row>
        ))}
      </Table>
    </details>
  );
}
