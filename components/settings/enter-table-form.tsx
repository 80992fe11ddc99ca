'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useWrite } from '@/components/api/use-api';
import { FormRefusal } from '@/components/people/public-page';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { VerdictMark } from '@/components/ui/marks';
import { showMessage } from '@/components/ui/message';
import { Cell, Row, Table } from '@/components/ui/table';
import {
  enterOwnTable,
  getReferenceTable,
  getTablesInForce,
  listReferenceTables,
  type ReferenceTable,
} from '@/lib/reference/contract';
import { documentOf } from '@/lib/reference/own-table';

import type { ReadTable } from './enter-table';

const Document = enterOwnTable.input.pick({ title: true, edition: true, clause: true });

/** What is wrong in the file, or where its rows were read and the way to enter them. */
export function EnterTableForm({ table, read }: { table: ReferenceTable; read: ReadTable }) {
  const { checked, cells } = read;
  const wrong = checked.problems.filter((one) => one.length > 0).length;
  return (
    <div className="flex flex-col gap-3 pt-3">
      <div role="status">
        <strong className={wrong > 0 ? 'text-held-ink' : 'text-proved-ink'}>
          {wrong > 0
            ? `${wrong} of ${count(cells.length)} ${wrong === 1 ? 'is' : 'are'} wrong.`
            : `${read.name}: ${count(cells.length)}, nothing is wrong.`}
        </strong>{' '}
        {wrong === 0 && changesWords(checked.changes)}{' '}
        {checked.ignored.length > 0 && (
          <span className="text-quiet">Not used: {checked.ignored.join(', ')}.</span>
        )}
      </div>
      {wrong > 0 ? <Problems read={read} /> : <DocumentForm table={table} read={read} />}
    </div>
  );
}

const count = (rows: number): string => `${rows.toLocaleString('en-US')} ${rows === 1 ? 'row' : 'rows'}`;

const changesWords = ({ same, added, gone }: ReadTable['checked']['changes']): string =>
  added === 0 && gone === 0
    ? 'They are the rows in force.'
    : `Against the edition in force ${same} are the same, ${added} new, ${gone} gone.`;

const PROBLEM_COLUMNS = [{ says: 'Row', right: true }, { says: 'Column' }, { says: 'What is wrong' }];

function Problems({ read: { checked } }: { read: ReadTable }) {
  const all = checked.problems.flatMap((problems, at) =>
    problems.map((problem) => ({ ...problem, number: at + 1 })),
  );
  return (
    <>
      <Table label="What is wrong in the file" columns={PROBLEM_COLUMNS} dense>
        {all.slice(0, SHOWN).map(({ number, column, message }) => (
          <Row key={`${number} ${column} ${message}`} state="asks">
            <Cell figure head="Row">
              {number}
            </Cell>
            <Cell strong head="Column">
              {column}
            </Cell>
            <Cell className="[overflow-wrap:anywhere]">
              <span className="flex items-start gap-1.5 text-held-ink">
                <VerdictMark verdict="does_not_meet" size={12} className="mt-[3px] flex-none" />
                {message}
              </span>
            </Cell>
          </Row>
        ))}
      </Table>
      <p className="text-second text-quiet">
        {all.length > SHOWN && `And ${all.length - SHOWN} more. `}
        Nothing is entered. Put them right in the file and choose it again.
      </p>
    </>
  );
}

const SHOWN = 100;

function DocumentForm({ table, read: { heads, cells } }: { table: ReferenceTable; read: ReadTable }) {
  const { tableId, inForce } = table;
  const write = useWrite(enterOwnTable, {
    refreshes: [getReferenceTable, listReferenceTables, getTablesInForce],
  });
  const form = useForm({
    resolver: zodResolver(Document),
    defaultValues: { title: inForce?.title ?? '', edition: '', clause: inForce?.clause ?? '' },
  });
  const { errors } = form.formState;
  const enter = form.handleSubmit((document) =>
    write
      .mutateAsync({ tableId, heads, cells, follows: inForce?.id ?? null, ...document })
      .then(() => showMessage({ says: `${documentOf(document)} is in force.` }), showOnForm(form)),
  );
  return (
    <form noValidate onSubmit={(event) => void enter(event)} className="flex flex-col gap-4">
      <p>Say where these rows stand in your own copy. Every row is then cited from there, with your name.</p>
      <div className="grid items-start gap-x-6 gap-y-3 md:grid-cols-3">
        <TextField
          label="Specification"
          hint="number and title, as on its cover"
          autoComplete="off"
          error={errors.title?.message}
          {...form.register('title')}
        />
        <TextField
          label="Edition"
          hint="revision, issue or date"
          autoComplete="off"
          error={errors.edition?.message}
          {...form.register('edition')}
        />
        <TextField
          label="Clause"
          hint="where in it the table stands"
          autoComplete="off"
          error={errors.clause?.message}
          {...form.register('clause')}
        />
      </div>
      <FormRefusal says={errors.root?.message} />
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <Button look="primary" type="submit" busy={write.isPending} busyLabel="Entering">
          Enter {count(cells.length)}
        </Button>
        <span className="text-second text-quiet">
          From then on they take precedence in your shop. What was frozen stays as it is.
        </span>
      </div>
    </form>
  );
}
