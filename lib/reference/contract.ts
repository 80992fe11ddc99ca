import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Done, Id, Moment } from '@/lib/api/shapes';

const TableId = z.string().trim().min(1).max(60);

/** A shop's own edition: what it was entered from, by whom, and what became of it. */
const Entry = z.object({
  id: Id,
  title: z.string(),
  edition: z.string(),
  clause: z.string(),
  rows: z.int(),
  enteredByName: z.string(),
  enteredAt: Moment,
  supersededAt: Moment.nullable(),
  withdrawnAt: Moment.nullable(),
});
export type TableEntry = z.output<typeof Entry>;

export const listReferenceTables = declare({
  id: 'listReferenceTables',
  method: 'get',
  path: '/reference-tables',
  summary: 'The tables that answers are read from, by subject, with the edition in force of each',
  side: 'shop',
  permission: 'reference.read',
  input: z.object({}),
  response: z.object({
    subjects: z.array(
      z.object({
        subject: z.string(),
        tables: z.array(
          z.object({
            tableId: TableId,
            title: z.string(),
            rows: z.int(),
            /** Of the published table. */
            published: z.string(),
            /** The shop's own edition in force; null where the published one is. */
            own: Entry.nullable(),
          }),
        ),
      }),
    ),
  }),
});

export const getReferenceTable = declare({
  id: 'getReferenceTable',
  method: 'get',
  path: '/reference-tables/{tableId}',
  summary: 'One table with its rows as a spreadsheet has them, and the editions that the shop entered',
  side: 'shop',
  permission: 'reference.read',
  input: z.object({
    tableId: TableId,
    /** An entry of the shop to look at; left out: the edition in force. */
    entryId: Id.optional(),
  }),
  response: z.object({
    tableId: TableId,
    title: z.string(),
    published: z.string(),
    /** The edition whose rows are shown; null: the published one. */
    shown: Entry.nullable(),
    isInForce: z.boolean(),
    /** The entry in force now; null: the published table. */
    inForce: Entry.nullable(),
    columns: z.array(z.object({ head: z.string(), says: z.string() })),
    /** By row and column; a cell is empty where the row says nothing. */
    cells: z.array(z.array(z.string())),
    /** Of each row, where it comes from. */
    sources: z.array(z.string()),
    /** Newest first. */
    history: z.array(Entry),
  }),
});
export type ReferenceTable = z.output<typeof getReferenceTable.response>;

export const MOST_TABLE_ROWS = 1000;
const Cell = z.string().max(2000, 'A cell is longer than 2,000 letters.');
const Sheet = z.object({
  tableId: TableId,
  /** The first line of the file: names of columns. */
  heads: z.array(z.string().max(200)).min(1).max(200),
  /** The lines under it. */
  cells: z
    .array(z.array(Cell).max(200))
    .max(MOST_TABLE_ROWS, `A table has at most ${MOST_TABLE_ROWS.toLocaleString('en-US')} rows.`),
});

export const checkOwnTable = declare({
  id: 'checkOwnTable',
  method: 'post',
  path: '/reference-tables/{tableId}/check',
  summary: 'What is wrong with the rows of an own edition, by row and column; changes nothing',
  side: 'shop',
  permission: 'reference.edit',
  input: Sheet,
  response: z.object({
    fault: z.string().nullable(),
    ignored: z.array(z.string()),
    problems: z.array(z.array(z.object({ column: z.string(), message: z.string() }))),
    /** Against the edition in force. */
    changes: z.object({ same: z.int(), added: z.int(), gone: z.int() }),
  }),
});

export const enterOwnTable = declare({
  id: 'enterOwnTable',
  method: 'post',
  path: '/reference-tables/{tableId}/entries',
  summary: "Enter the shop's own edition of a table; it takes precedence from now on",
  side: 'shop',
  permission: 'reference.edit',
  input: Sheet.extend({
    title: z.string().trim().min(1, 'Name the specification.').max(80, 'Use 80 letters or less.'),
    edition: z
      .string()
      .trim()
      .min(1, 'Say which edition: revision, issue or date.')
      .max(40, 'Use 40 letters or less.'),
    clause: z
      .string()
      .trim()
      .min(1, 'Say where in it the table stands: clause or table number.')
      .max(40, 'Use 40 letters or less.'),
    /** The entry that was in force when the person looked; null: the published table. */
    follows: Id.nullable(),
  }),
  response: z.object({ entryId: Id }),
});

export const withdrawOwnTable = declare({
  id: 'withdrawOwnTable',
  method: 'post',
  path: '/reference-tables/{tableId}/entries/{entryId}/withdraw',
  summary: "Take the shop's own edition out of force; the published table holds again",
  side: 'shop',
  permission: 'reference.edit',
  input: z.object({ tableId: TableId, entryId: Id }),
  response: Done,
});

export const getTablesInForce = declare({
  id: 'getTablesInForce',
  method: 'get',
  path: '/tables-in-force',
  summary: "The shop's own editions in force, with their rows; every other table is the published one",
  side: 'shop',
  permission: 'reference.read',
  input: z.object({}),
  response: z.object({
    own: z.array(
      z.object({
        id: Id,
        tableId: TableId,
        title: z.string(),
        edition: z.string(),
        clause: z.string(),
        enteredByName: z.string(),
        rows: z.array(z.record(z.string(), z.unknown())),
      }),
    ),
  }),
});
