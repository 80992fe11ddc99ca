import type { Replaceable } from './replaceable';
import { rowFromCells, type CellProblem } from './rows-in-cells';

/** A file as it was read: the names in its first line, and every line under it. */
export interface Sheet {
  readonly heads: readonly string[];
  readonly cells: readonly (readonly string[])[];
}

export interface OwnRows {
  /** What is wrong with the file as a whole; then nothing is said of its rows. */
  readonly fault: string | null;
  /** Columns of the file that the table does not have. */
  readonly ignored: readonly string[];
  /** By row of the file. */
  readonly problems: readonly (readonly CellProblem[])[];
  /** All of them where nothing is wrong, else those that are right. */
  readonly rows: readonly unknown[];
}

/** The rows of a shop's own edition from its file; what is wrong is said by row and column. */
export function readOwnRows(table: Replaceable, { heads, cells }: Sheet): OwnRows {
  const { columns } = table;
  const places = columns.map(({ head }) => heads.findIndex((one) => plain(one) === plain(head)));
  const ignored = heads.filter(
    (one) => one.trim() !== '' && !columns.some(({ head }) => plain(head) === plain(one)),
  );
  if (places.every((at) => at === -1))
    return refused(
      `The first line must name the columns: ${columns
        .slice(0, 6)
        .map(({ head }) => head)
        .join(', ')}.`,
    );
  const twice = columns.find(({ head }) => heads.filter((one) => plain(one) === plain(head)).length > 1);
  if (twice) return refused(`The column ${twice.head} is there twice.`);
  if (cells.length === 0) return refused('There are the names of the columns and no rows under them.');
  const read = cells.map((line) =>
    rowFromCells(
      columns,
      table.row,
      places.map((at) => line[at] ?? ''),
    ),
  );
  const rows = read.flatMap((one) => (one.ok ? [one.row] : []));
  const problems = read.map((one) => (one.ok ? [] : one.problems));
  const order = problems.every((one) => one.length === 0) ? outOfOrder(table, rows) : null;
  return {
    fault: null,
    ignored,
    problems: problems.map((one, at) => (order?.at === at ? [order.problem] : one)),
    rows,
  };
}

const refused = (fault: string): OwnRows => ({ fault, ignored: [], problems: [], rows: [] });

/** Spaces, case and marks do not matter; spreadsheets change them. */
const plain = (head: string): string => head.toLowerCase().replace(/[^a-z0-9°%/]+/g, '');

/** Rows are looked up from the top, so a thinner one below a thicker one would never be found. */
function outOfOrder(
  { rising, columns }: Replaceable,
  rows: readonly unknown[],
): { at: number; problem: CellProblem } | null {
  if (rising === undefined) return null;
  const figures = rows.map((row) => (row as Record<string, number | null>)[rising] ?? null);
  const at = figures.findIndex((figure, i) => {
    const before = i === 0 ? -Infinity : (figures[i - 1] ?? Infinity);
    return (figure ?? Infinity) <= before && i > 0;
  });
  if (at === -1) return null;
  const column = columns.find(({ path }) => path[0] === rising)?.head ?? '';
  return {
    at,
    problem: {
      column,
      message: `Is not above that of row ${at}. Rows are looked up from the top: put them in rising order, the one without a limit last.`,
    },
  };
}
