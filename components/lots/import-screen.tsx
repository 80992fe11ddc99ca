'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useWrite } from '@/components/api/use-api';
import { saveText } from '@/components/files/save-text';
import { Button, ButtonLink } from '@/components/ui/button';
import { Failing } from '@/components/ui/failing';
import { FileDrop } from '@/components/ui/file-drop';
import { Loading } from '@/components/ui/loading';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import type { OutputOf } from '@/lib/api/endpoint';
import { checkLotImport, importLots, listLots } from '@/lib/lots/contract';
import { IMPORT_COLUMNS, importTemplate, piecesIn, type RawRow } from '@/lib/lots/import-row';
import { ImportTable } from './import-table';
import { readImportFile } from './read-import-file';

interface Preview {
  name: string;
  rows: RawRow[];
  ignored: string[];
  checked: OutputOf<typeof checkLotImport>;
}

/** Many lots from one file: shown row by row first, and imported whole or not at all. */
export function ImportScreen() {
  const [preview, setPreview] = useState<Preview | null>(null);
  const [fault, setFault] = useState<string>();
  const check = useWrite(checkLotImport);

  const read = async ([file]: File[]) => {
    if (!file) return;
    setPreview(null);
    setFault(undefined);
    const found = await readImportFile(file);
    if (!found.ok) return setFault(found.message);
    try {
      const checked = await check.mutateAsync({ rows: found.rows });
      setPreview({ name: file.name, rows: found.rows, ignored: found.ignored, checked });
    } catch (error) {
      setFault(error instanceof Error ? error.message : 'The file could not be looked through. Try again.');
    }
  };

  return (
    <>
      <PageHead
        title="Import lots"
        sub="From a spreadsheet saved as CSV. You see every row first; nothing is imported until all are right."
      />
      <div className="grid grid-cols-[minmax(0,2fr)_minmax(0,1fr)] gap-9 max-md:grid-cols-1 max-md:gap-4">
        <FileDrop
          label={preview ? 'Choose the file again, or another' : 'CSV file of lots'}
          accept=".csv,.tsv,.txt,text/csv"
          onFiles={(files) => void read(files)}
          error={fault}
          hint="comma, semicolon or tab between the cells; at most 1,000 rows"
        />
        <div className="pt-6 max-md:pt-0">
          <Button onClick={() => saveText('lots.csv', importTemplate())}>
            Save an empty file to fill in
          </Button>
        </div>
      </div>
      {check.isPending && <Loading label="Looking through the file" />}
      {!preview && !check.isPending && <ColumnsOfFile />}
      {preview && (
        <PreviewOfImport
          key={preview.name}
          preview={preview}
          onChanged={(checked) => setPreview({ ...preview, checked })}
        />
      )}
    </>
  );
}

function ColumnsOfFile() {
  return (
    <Section title="What the file has" note="the first line names the columns, in any order" className="mt-6">
      <Table
        label="Columns of the file"
        columns={[{ says: 'Column' }, { says: 'Example' }, { says: 'What it is' }]}
      >
        {IMPORT_COLUMNS.map((column) => (
          <Row key={column.key}>
            <Cell strong>{column.head}</Cell>
            <Cell code head="Example">
              {column.example}
            </Cell>
            <Cell>
              {column.says}
              {!column.must && <span className="text-quiet"> May be empty or left out.</span>}
            </Cell>
          </Row>
        ))}
      </Table>
    </Section>
  );
}

function PreviewOfImport({
  preview,
  onChanged,
}: {
  preview: Preview;
  onChanged: (checked: Preview['checked']) => void;
}) {
  const router = useRouter();
  const { rows, checked, ignored, name } = preview;
  const run = useWrite(importLots, { refreshes: [listLots] });
  const check = useWrite(checkLotImport);
  const wrong = checked.rows.filter(({ problems }) => problems.length > 0).length;
  const pieces = rows.reduce((sum, row) => sum + (piecesIn(row) || 0), 0);

  const start = () =>
    run
      .mutateAsync(
        { rows },
        {
          onSuccess: ({ lots }) => {
            showMessage({
              says: `${count(lots.length, 'lot')} imported, ${pieces.toLocaleString('en-US')} pc.`,
            });
            router.push('/lots');
          },
          // Something was added by another meanwhile: the rows say what.
          onError: (error) =>
            void (error.problem.fields && check.mutateAsync({ rows }).then(onChanged, () => undefined)),
        },
      )
      .catch(() => undefined);

  return (
    <Section
      className="mt-6"
      title={name}
      note={
        <>
          {count(rows.length, 'row')}
          {ignored.length > 0 && `; not used: ${ignored.join(', ')}`}
        </>
      }
    >
      {run.error && <Failing says={run.error.problem.title} />}
      <ImportTable rows={rows} checked={checked} />
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2 pt-4">
        <Button
          look="primary"
          onClick={start}
          busyLabel="Importing"
          notNow={
            wrong > 0 &&
            `${wrong === 1 ? '1 row is' : `${wrong} rows are`} wrong. Put them right in the file and choose it again.`
          }
        >
          Import {count(rows.length, 'lot')}
        </Button>
        <ButtonLink href="/lots">Leave without importing</ButtonLink>
        {wrong === 0 && (
          <span className="text-second text-quiet">
            All rows are right: <span className="num">{pieces.toLocaleString('en-US')}</span> pc will wait for
            their first step.
          </span>
        )}
      </div>
    </Section>
  );
}

const count = (many: number, thing: string): string =>
  `${many.toLocaleString('en-US')} ${thing}${many === 1 ? '' : 's'}`;
