import { and, desc, eq, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { referenceTables } from '@/db/schema/reference';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { sourceWords } from '@/lib/batches/source-words';
import { notFound } from '@/lib/errors';

import { whatIsRight } from './cell-text';
import type { getReferenceTable as declaration, getTablesInForce as inForceDeclaration } from './contract';
import { ownTables } from './own-table';
import type { Replaceable } from './replaceable';
import { REPLACEABLE, TABLES_BY_SUBJECT } from './replaceable-tables';
import { cellsOfRow } from './rows-in-cells';
import { readOwnEntries } from './tables-of';

const ENTRY = {
  id: referenceTables.id,
  tableId: referenceTables.tableId,
  title: referenceTables.title,
  edition: referenceTables.edition,
  clause: referenceTables.clause,
  rows: sql<number>`jsonb_array_length(${referenceTables.rows})`,
  enteredByName: referenceTables.enteredByName,
  enteredAt: referenceTables.createdAt,
  supersededAt: referenceTables.supersededAt,
  withdrawnAt: referenceTables.withdrawnAt,
};
type Entry = Awaited<ReturnType<typeof readEntries>>[number];

const readEntries = (ctx: Ctx, tableId?: string) =>
  ctx.tx
    .select(ENTRY)
    .from(referenceTables)
    .where(tableId === undefined ? sql`true` : eq(referenceTables.tableId, tableId))
    .orderBy(desc(referenceTables.createdAt), desc(referenceTables.id));

const isInForce = ({ supersededAt, withdrawnAt }: Entry): boolean =>
  supersededAt === null && withdrawnAt === null;

/** Every table that the shop may enter its own edition of, with the one in force. */
export async function listReferenceTables(ctx: Ctx) {
  authorize(ctx, 'reference.read');
  const own = (await readEntries(ctx)).filter(isInForce);
  return {
    subjects: TABLES_BY_SUBJECT.map(({ subject, tables }) => ({
      subject,
      tables: tables.map(({ published: { id, title, edition, rows } }) => {
        const entry = own.find(({ tableId }) => tableId === id) ?? null;
        return { tableId: id, title, rows: entry?.rows ?? rows.length, published: edition, own: entry };
      }),
    })),
  };
}

export function replaceableTable(tableId: string): Replaceable {
  const found = REPLACEABLE.get(tableId);
  if (!found) throw notFound('table');
  return found;
}

/** One table: the rows of the edition in force, or of the entry that is named. */
export async function getReferenceTable(
  ctx: Ctx,
  { tableId, entryId }: z.output<(typeof declaration)['input']>,
): Promise<z.input<(typeof declaration)['response']>> {
  authorize(ctx, 'reference.read');
  const { published, columns } = replaceableTable(tableId);
  const history = await readEntries(ctx, tableId);
  const inForce = history.find(isInForce) ?? null;
  const shown = entryId === undefined ? inForce : (history.find(({ id }) => id === entryId) ?? null);
  if (entryId !== undefined && shown === null) throw notFound('edition');
  const rows = shown === null ? published.rows : await readRows(ctx, shown);
  return {
    ...{ tableId, title: published.title, published: published.edition },
    ...{ shown, inForce, history, isInForce: shown?.id === inForce?.id },
    columns: columns.map(({ head, shapes }) => ({ head, says: shapes.map(whatIsRight).join(', or ') })),
    cells: rows.map((row) => cellsOfRow(columns, row)),
    sources: rows.map(({ source }) => sourceWords(source)),
  };
}

async function readRows(ctx: Ctx, { id, tableId }: Entry): Promise<Replaceable['published']['rows']> {
  const [found] = await ctx.tx
    .select()
    .from(referenceTables)
    .where(and(eq(referenceTables.id, id), eq(referenceTables.tableId, tableId)));
  return (found && ownTables([found]).get(tableId)?.rows) ?? [];
}

/** What the browser puts in place of published tables. */
export async function getTablesInForce(ctx: Ctx): Promise<z.input<(typeof inForceDeclaration)['response']>> {
  authorize(ctx, 'reference.read');
  const own = await readOwnEntries(ctx);
  return { own: own.map((entry) => ({ ...entry, rows: entry.rows as Record<string, unknown>[] })) };
}
