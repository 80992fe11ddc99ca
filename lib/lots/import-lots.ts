import { inArray, sql } from 'drizzle-orm';

import { lots } from '@/db/schema/lots';
import { parts } from '@/db/schema/parts';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError, type FieldError } from '@/lib/errors';

import { dayMade, noonOf } from './day-made';
import { ImportRow, piecesIn, serialsIn, type RawRow } from './import-row';
import { makeLot, noRoute } from './make-lot';

interface Checked {
  problems: FieldError[];
  part: KnownPart | null;
}

type KnownPart = Awaited<ReturnType<typeof partsNamed>>[number];

/** What is wrong with each row, by itself, against the others and against what is here. Changes nothing. */
export async function checkLotImport(ctx: Ctx, { rows }: { rows: readonly RawRow[] }) {
  authorize(ctx, 'lot.create');
  const checked = await check(ctx, rows);
  return { isClean: checked.every(({ problems }) => problems.length === 0), rows: checked };
}

/** Adds all lots of the file in one transaction. One row that is wrong, and nothing is imported. */
export async function importLots(ctx: Ctx, { rows }: { rows: readonly RawRow[] }) {
  authorize(ctx, 'lot.create');
  const checked = await check(ctx, rows);
  const fields = checked.flatMap(({ problems }, at) =>
    problems.map(({ field, message }) => ({
      field: `rows.${at}.${field}`,
      message: `Row ${at + 1}: ${message}`,
    })),
  );
  if (fields.length > 0)
    throw new AppError(
      'bad_input',
      `Nothing is imported: ${fields.length === 1 ? 'one thing is' : `${fields.length} things are`} wrong. Put them right in the file and choose it again.`,
      { fields },
    );

  const today = await dayMade(ctx, '');
  const made = [];
  for (const [at, raw] of rows.entries()) {
    const row = ImportRow.parse(raw);
    const part = checked[at]?.part;
    if (!part) throw new Error(`row ${at + 1} was clean and has no part`);
    made.push(
      await makeLot(ctx, {
        part,
        number: row.lot,
        heat: row.heat,
        pieces: piecesIn(row),
        serials: serialsIn(row.serials),
        madeOn: row.madeOn === '' ? today : noonOf(row.madeOn),
        millCertificateFileId: null,
        note: row.note === '' ? null : row.note,
      }),
    );
  }
  return { lots: made, pieces: rows.reduce((sum, row) => sum + piecesIn(row), 0) };
}

async function check(ctx: Ctx, rows: readonly RawRow[]): Promise<Checked[]> {
  const known = await partsNamed(ctx, [...new Set(rows.map(({ part }) => part.trim()))]);
  const numbers = rows.map(({ lot }) => lot.trim());
  const taken = await takenNumbers(ctx, numbers);
  return rows.map((raw, at) => {
    const parsed = ImportRow.safeParse(raw);
    const problems = parsed.success
      ? []
      : parsed.error.issues.map(({ path, message }) => ({ field: String(path[0]), message }));
    const { part, problem } = findPart(raw, known);
    if (problem && raw.part.trim() !== '') problems.push(problem);
    if (part) problems.push(...faultsWithPart(raw, part));
    const number = numbers[at] ?? '';
    const first = numbers.indexOf(number);
    if (number !== '' && taken.has(number))
      problems.push({
        field: 'lot',
        message: `Lot ${number} is here already. Leave it empty for the next number.`,
      });
    else if (number !== '' && first < at)
      problems.push({ field: 'lot', message: `Lot ${number} is in row ${first + 1} too.` });
    return { problems, part };
  });
}

function findPart(
  row: RawRow,
  known: readonly KnownPart[],
): { part: KnownPart | null; problem?: FieldError } {
  const [number, revision] = [row.part.trim(), row.revision.trim()];
  const same = known.filter((part) => part.number === number);
  if (same.length === 0)
    return {
      part: null,
      problem: { field: 'part', message: `There is no part ${number}. Add it first, or correct the number.` },
    };
  const part =
    revision === '' ? same.find(({ isCurrent }) => isCurrent) : same.find((one) => one.revision === revision);
  if (part) return { part };
  const revisions = same.map((one) => one.revision).join(', ');
  return {
    part: null,
    problem: {
      field: 'revision',
      message: `${number} has rev ${revisions}, not ${revision === '' ? 'a current one' : revision}.`,
    },
  };
}

function faultsWithPart(row: RawRow, part: KnownPart): FieldError[] {
  const serials = serialsIn(row.serials).length;
  return [
    ...(part.firstStepId === null ? [{ field: 'part', message: noRoute(part) }] : []),
    ...(part.serialised && serials === 0
      ? [
          {
            field: 'serials',
            message: `Each piece of ${part.number} has its own serial. List them, divided by semicolons.`,
          },
        ]
      : []),
    ...(!part.serialised && serials > 0
      ? [
          {
            field: 'serials',
            message: `The pieces of ${part.number} have no serials. Leave the column empty.`,
          },
        ]
      : []),
  ];
}

function partsNamed(ctx: Ctx, numbers: readonly string[]) {
  return ctx.tx
    .select({
      id: parts.id,
      number: parts.number,
      revision: parts.revision,
      name: parts.name,
      serialised: parts.serialised,
      isCurrent: sql<boolean>`parts.superseded_at is null`,
      firstStepId: sql<
        string | null
      >`(select s.id from route_steps s where s.part_id = parts.id order by s.seq limit 1)`,
    })
    .from(parts)
    .where(inArray(parts.number, [...numbers]))
    .orderBy(parts.number, parts.createdAt);
}

async function takenNumbers(ctx: Ctx, numbers: readonly string[]): Promise<Set<string>> {
  const given = [...new Set(numbers.filter((number) => number !== ''))];
  if (given.length === 0) return new Set();
  const rows = await ctx.tx.select({ number: lots.number }).from(lots).where(inArray(lots.number, given));
  return new Set(rows.map(({ number }) => number));
}
