import { and, eq, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { referenceTables } from '@/db/schema/reference';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { personOf, shopOf, type Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';

import type {
  checkOwnTable as checkDeclaration,
  enterOwnTable as declaration,
  withdrawOwnTable as withdrawDeclaration,
} from './contract';
import { documentOf } from './own-table';
import { replaceableTable } from './queries';
import { readOwnRows } from './read-own-rows';
import { cellsOfRow } from './rows-in-cells';

/** What is wrong with the rows of a file, and how they differ from the edition in force. Changes nothing. */
export async function checkOwnTable(
  ctx: Ctx,
  { tableId, ...sheet }: z.output<(typeof checkDeclaration)['input']>,
) {
  authorize(ctx, 'reference.edit');
  const table = replaceableTable(tableId);
  const { fault, ignored, problems, rows } = readOwnRows(table, sheet);
  const inForce = await entryInForce(ctx, tableId);
  const lines = (all: readonly unknown[]) => all.map((row) => cellsOfRow(table.columns, row).join('\t'));
  const [before, after] = [lines(inForce?.rows ?? table.published.rows), lines(rows)];
  const same = after.filter((line) => before.includes(line)).length;
  return {
    ...{ fault, ignored: [...ignored], problems: problems.map((one) => [...one]) },
    changes: {
      same,
      added: after.length - same,
      gone: before.filter((line) => !after.includes(line)).length,
    },
  };
}

/**
 * Enters the shop's own edition of a table. From now on every answer for the shop is read from it; what was frozen
 * before stays as it was. The edition before it, if it was the shop's, is kept.
 */
export async function enterOwnTable(
  ctx: Ctx,
  { tableId, title, edition, clause, follows, ...sheet }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'reference.edit');
  const by = personOf(ctx.actor);
  if (by === null) throw new AppError('not_allowed', 'Only a person can enter an edition of a table.');
  const table = replaceableTable(tableId);
  const { fault, problems, rows } = readOwnRows(table, sheet);
  refuseWrong(fault, problems);
  const before = await endInForce(ctx, { tableId, entryId: follows }, { supersededAt: ctx.now });
  const id = newId();
  const [added] = await ctx.tx
    .insert(referenceTables)
    .values({
      ...{ id, shopId: shopOf(ctx), tableId, title, edition, clause, rows },
      ...{ enteredBy: by, enteredByName: ctx.actor.name, createdAt: ctx.now },
    })
    .onConflictDoNothing()
    .returning({ id: referenceTables.id });
  if (!added || (follows !== null && !before)) throw changedMeanwhile();
  await recordAudit(ctx, {
    action: 'reference_table.enter',
    entity: 'reference_table',
    entityId: id,
    before: { edition: before ? documentOf(before) : `published: ${table.published.edition}` },
    after: {
      table: table.published.title,
      edition: documentOf({ title, edition, clause }),
      rows: rows.length,
    },
  });
  return { entryId: id };
}

/** Takes the shop's own edition out of force. It is kept: what was frozen names it. */
export async function withdrawOwnTable(
  ctx: Ctx,
  { tableId, entryId }: z.output<(typeof withdrawDeclaration)['input']>,
) {
  authorize(ctx, 'reference.edit');
  const by = personOf(ctx.actor);
  if (by === null) throw new AppError('not_allowed', 'Only a person can withdraw an edition of a table.');
  const { published } = replaceableTable(tableId);
  const ended = await endInForce(ctx, { tableId, entryId }, { withdrawnAt: ctx.now, withdrawnBy: by });
  if (!ended) await refuseWithdrawal(ctx, { tableId, entryId });
  await recordAudit(ctx, {
    action: 'reference_table.withdraw',
    entity: 'reference_table',
    entityId: entryId,
    before: { table: published.title, edition: ended ? documentOf(ended) : '' },
    after: { edition: `published: ${published.edition}` },
  });
  return { done: true as const };
}

const changedMeanwhile = () =>
  new AppError(
    'conflict',
    'Somebody changed the edition in force meanwhile. Look at it, then enter yours again.',
  );

function refuseWrong(
  fault: string | null,
  problems: readonly (readonly { column: string; message: string }[])[],
): void {
  if (fault !== null)
    throw new AppError('bad_input', fault, { fields: [{ field: 'cells', message: fault }] });
  const fields = problems.flatMap((one, at) =>
    one.map(({ column, message }) => ({
      field: `cells.${at}`,
      message: `Row ${at + 1}${column && `, ${column}`}: ${message}`,
    })),
  );
  if (fields.length > 0)
    throw new AppError(
      'bad_input',
      `Nothing is entered: ${fields.length === 1 ? 'one thing is' : `${fields.length} things are`} wrong. Put them right in the file and choose it again.`,
      { fields },
    );
}

/** The condition stands in the WHERE, so that of two people one wins. Nothing where that entry is not in force. */
async function endInForce(
  ctx: Ctx,
  { tableId, entryId }: { tableId: string; entryId: string | null },
  set: { supersededAt: Date } | { withdrawnAt: Date; withdrawnBy: string },
) {
  if (entryId === null) return undefined;
  const [ended] = await ctx.tx
    .update(referenceTables)
    .set(set)
    .where(and(eq(referenceTables.id, entryId), inForceOf(tableId)))
    .returning({
      title: referenceTables.title,
      edition: referenceTables.edition,
      clause: referenceTables.clause,
    });
  return ended;
}

const inForceOf = (tableId: string) =>
  and(
    eq(referenceTables.tableId, tableId),
    isNull(referenceTables.supersededAt),
    isNull(referenceTables.withdrawnAt),
  );

async function entryInForce(ctx: Ctx, tableId: string) {
  const [found] = await ctx.tx
    .select({ rows: referenceTables.rows })
    .from(referenceTables)
    .where(inForceOf(tableId));
  return found;
}

async function refuseWithdrawal(ctx: Ctx, { tableId, entryId }: { tableId: string; entryId: string }) {
  const [known] = await ctx.tx
    .select({ id: referenceTables.id })
    .from(referenceTables)
    .where(and(eq(referenceTables.id, entryId), eq(referenceTables.tableId, tableId)));
  throw known ? new AppError('conflict', 'This edition is not in force any more.') : notFound('edition');
}
